import { intakeText } from '#shared/text/intake.ts';
import { Problem } from '../../http/problem.ts';

function without(forbidden: RegExp, pointer: string, value: string): string {
  if (!forbidden.test(value)) return value;
  const detail = intakeText.problems.control;
  throw new Problem('invalid', detail, { errors: [{ pointer, detail }] });
}

/** A typed line without control characters: a NUL cannot even be stored. @throws Problem invalid. */
export const plainText = (pointer: string, value: string): string => without(/\p{Cc}/u, pointer, value);

/** The same for several lines: line ends may stay. @throws Problem invalid. */
export const plainParagraph = (pointer: string, value: string): string =>
  without(/[^\P{Cc}\r\n\t]/u, pointer, value);
