import { setMakingText } from '#shared/text/set-making.ts';
import { type Definition, isShare } from './definition.ts';

/** What is wrong at a field. */
export interface Wrong {
  readonly fieldId: string;
  readonly message: string;
}

/** The shares of a mix that are no numbers from 1 to 1000. */
export function wrongShares({ entries }: Definition): Wrong[] {
  if (entries.length < 2) return [];
  return entries.flatMap(({ parts }, at) =>
    isShare(parts) ? [] : [{ fieldId: `define-parts-${at}`, message: setMakingText.define.partsWrong }],
  );
}

/**
 * What stays wrong once the definition is changed: the name, and once shares are complained of, those that are none
 * yet. What the server refused the old definition for goes with it.
 */
export function stillWrong(wrong: readonly Wrong[], next: Definition): readonly Wrong[] {
  const name = wrong.filter(({ fieldId }) => fieldId === 'define-name');
  const complained = wrong.some(({ fieldId }) => fieldId.startsWith('define-parts-'));
  return complained ? [...name, ...wrongShares(next)] : name;
}
