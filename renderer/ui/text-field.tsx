import type { InputHTMLAttributes, TextareaHTMLAttributes } from 'react';
import { describedBy, Field, type FieldBasics, inputClass } from './field.tsx';

type Rest<T> = Omit<T, keyof FieldBasics | 'className'>;

/** One line of text, with any native input attribute. */
export function TextField({
  id,
  label,
  hint,
  error,
  ...rest
}: FieldBasics & Rest<InputHTMLAttributes<HTMLInputElement>>) {
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <input
        type="text"
        {...rest}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, hint, error })}
        className={inputClass(error)}
      />
    </Field>
  );
}

/** Several lines of text. */
export function TextAreaField({
  id,
  label,
  hint,
  error,
  ...rest
}: FieldBasics & Rest<TextareaHTMLAttributes<HTMLTextAreaElement>>) {
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <textarea
        rows={4}
        {...rest}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, hint, error })}
        className={inputClass(error)}
      />
    </Field>
  );
}
