import type { ReactNode } from 'react';
import { cx } from './cx.ts';

/** What every field has: a visible label, and perhaps a hint and an error, all read out with it. */
export interface FieldBasics {
  /** Unique on the page; error summaries link to it. */
  readonly id: string;
  readonly name?: string;
  readonly label: string;
  readonly hint?: ReactNode;
  readonly error?: string;
}

/** The ids of a field's hint and error for aria-describedby; undefined when it has neither. */
export function describedBy({
  id,
  hint,
  error,
}: Pick<FieldBasics, 'id' | 'hint' | 'error'>): string | undefined {
  return cx(hint ? `${id}-hint` : null, error ? `${id}-error` : null) || undefined;
}

/** The look shared by all inputs. */
export function inputClass(error: string | undefined): string {
  return cx(
    'block min-h-12 w-full rounded-key border-[1.5px] bg-sheet px-3 py-2 text-ink placeholder:text-ink-2',
    error ? 'border-rose' : 'border-ink',
  );
}

/** Label, hint and error around an input. */
export function Field({
  id,
  label,
  hint,
  error,
  children,
}: Omit<FieldBasics, 'name'> & { children: ReactNode }) {
  return (
    <div className={cx(error && 'border-l-4 border-rose pl-3')}>
      <label htmlFor={id} className="block font-bold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-ink-2">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="font-bold text-rose">
          {error}
        </p>
      )}
      <div className="mt-1">{children}</div>
    </div>
  );
}
