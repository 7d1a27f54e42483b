import type { SelectHTMLAttributes } from 'react';
import { describedBy, Field, type FieldBasics, inputClass } from './field.tsx';

export interface SelectOption {
  readonly value: string;
  readonly label: string;
  readonly disabled?: boolean;
}

/** One of a list, by the device's own control. */
export function SelectField({
  id,
  label,
  hint,
  error,
  options,
  ...rest
}: FieldBasics & { options: readonly SelectOption[] } & Omit<
    SelectHTMLAttributes<HTMLSelectElement>,
    keyof FieldBasics | 'className'
  >) {
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <select
        {...rest}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, hint, error })}
        className={inputClass(error)}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.disabled}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  );
}
