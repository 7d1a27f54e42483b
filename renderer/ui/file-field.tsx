import type { InputHTMLAttributes } from 'react';
import { cx } from './cx.ts';
import { describedBy, Field, type FieldBasics, inputClass } from './field.tsx';

/** A file from the device. */
export function FileField({
  id,
  label,
  hint,
  error,
  ...rest
}: FieldBasics & Omit<InputHTMLAttributes<HTMLInputElement>, keyof FieldBasics | 'className' | 'type'>) {
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <input
        {...rest}
        type="file"
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, hint, error })}
        className={cx(
          inputClass(error),
          'border-dashed file:mr-4 file:min-h-8 file:rounded-key file:border-0 file:bg-ink file:px-4 file:font-bold file:text-paper',
        )}
      />
    </Field>
  );
}
