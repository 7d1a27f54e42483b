import { type KeyboardEvent, useEffect, useRef } from 'react';
import { inputClass } from '#renderer/ui/index.ts';
import type { DraftLine } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';

const text = intakeText.draft;

export interface LineWords {
  readonly caseName: string;
  readonly algorithm: string;
}

/** The line being edited: what is typed so far. */
export interface LineEdit extends LineWords {
  readonly line: number;
}

export const formOf = (line: number): string => `edit-${line}`;

interface EditProps {
  readonly line: DraftLine;
  readonly edit: LineEdit;
  readonly onChange: (change: Partial<LineWords>) => void;
  readonly onCancel: () => void;
}

const TYPED_AS_IS = {
  spellCheck: false,
  autoCapitalize: 'off',
  autoCorrect: 'off',
  autoComplete: 'off',
} as const;

const onEscape = (leave: () => void) => (event: KeyboardEvent) => {
  if (event.key !== 'Escape') return;
  event.preventDefault();
  leave();
};

/** The case's name, in place. */
export function CaseInput({ line, edit, onChange, onCancel }: EditProps) {
  return (
    <input
      {...TYPED_AS_IS}
      form={formOf(line.line)}
      aria-label={text.editCase(line.line)}
      maxLength={60}
      value={edit.caseName}
      onChange={(event) => onChange({ caseName: event.target.value })}
      onKeyDown={onEscape(onCancel)}
      className={`${inputClass(undefined)} font-bold`}
    />
  );
}

/** The algorithm, in place; it has the focus when it appears, with the wrong token selected. */
export function AlgorithmInput({ line, edit, onChange, onCancel }: EditProps) {
  const input = useRef<HTMLInputElement>(null);
  const wrong = wrongPart(line);
  const selection = useRef(wrong);
  useEffect(() => {
    input.current?.focus();
    const at = selection.current;
    if (at) input.current?.setSelectionRange(at.column - 1, at.column - 1 + at.length);
  }, []);
  return (
    <input
      {...TYPED_AS_IS}
      ref={input}
      form={formOf(line.line)}
      aria-label={text.editAlgorithm(line.line)}
      maxLength={1000}
      value={edit.algorithm}
      onChange={(event) => onChange({ algorithm: event.target.value })}
      onKeyDown={onEscape(onCancel)}
      className={`${inputClass(undefined)} max-lg:mt-2`}
    />
  );
}

/** Where the token that is not a move stands: the finding's column is the first wrong character inside it. */
export function wrongPart({
  algorithm,
  column,
  token,
}: Pick<DraftLine, 'algorithm' | 'column' | 'token'>): { column: number; length: number } | undefined {
  if (column === null || !token) return undefined;
  for (let start = column - 1; start >= Math.max(0, column - token.length); start--) {
    if (algorithm.startsWith(token, start)) return { column: start + 1, length: token.length };
  }
  return { column, length: 1 };
}
