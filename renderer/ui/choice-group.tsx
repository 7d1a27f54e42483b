import type { ChangeEventHandler, ReactNode } from 'react';
import { cx } from './cx.ts';

export interface Choice {
  readonly value: string;
  readonly label: string;
  readonly hint?: ReactNode;
  readonly disabled?: boolean;
}

export interface ChoiceGroupProps {
  /** Unique on the page; error summaries link to it: it is the first choice's id. */
  readonly id: string;
  readonly name: string;
  readonly legend: string;
  readonly hint?: ReactNode;
  readonly error?: string;
  /** One of the choices, or any number of them. */
  readonly kind: 'one' | 'many';
  readonly choices: readonly Choice[];
  /** Chosen values. With `onChange` the group is controlled, without it these are where it starts. */
  readonly value: readonly string[];
  readonly onChange?: ChangeEventHandler<HTMLInputElement>;
  /** Two choices beside each other where the group would be too long for the screen: on narrow ones. */
  readonly paired?: boolean;
}

/** Choices in a ruled column; what is chosen is bold as well as marked. */
export function ChoiceGroup(props: ChoiceGroupProps) {
  const { id, name, legend, hint, error, kind, choices, value, onChange, paired = false } = props;
  const described = cx(hint ? `${id}-hint` : null, error ? `${id}-error` : null) || undefined;
  return (
    <fieldset aria-describedby={described} className={cx('min-w-0', error && 'border-l-4 border-rose pl-3')}>
      <legend className="pb-1 text-[0.9375rem] text-ink-2">{legend}</legend>
      {hint && (
        <p id={`${id}-hint`} className="pb-1 text-sm text-ink-2">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="pb-1 font-bold text-rose">
          {error}
        </p>
      )}
      <div
        className={cx(
          'frame bg-sheet',
          paired ? 'grid grid-cols-2 overflow-hidden lg:grid-cols-1' : 'divide-y-[1.5px] divide-ink',
        )}
      >
        {choices.map((choice, k) => {
          const own = k === 0 ? id : `${id}-${choice.value}`;
          const checked = value.includes(choice.value);
          return (
            <div
              key={choice.value}
              className={cx(
                'relative flex min-h-12 items-center gap-3 px-3 py-2 has-checked:font-bold',
                // Rules between cells: each draws its left and upper one, the outer ones lie under the frame.
                paired &&
                  '-ml-[1.5px] -mt-[1.5px] border-l-[1.5px] border-t-[1.5px] border-ink leading-tight max-lg:last:odd:col-span-2',
              )}
            >
              <input
                type={kind === 'one' ? 'radio' : 'checkbox'}
                id={own}
                name={name}
                value={choice.value}
                disabled={choice.disabled}
                aria-describedby={choice.hint ? `${own}-hint` : undefined}
                {...(onChange ? { checked, onChange } : { defaultChecked: checked })}
                className={cx('choice', kind === 'one' && 'rounded-full')}
              />
              <label htmlFor={own} className="min-w-0 after:absolute after:inset-0">
                {choice.label}
                {choice.hint && (
                  <span id={`${own}-hint`} className="block text-sm font-normal text-ink-2">
                    {choice.hint}
                  </span>
                )}
              </label>
            </div>
          );
        })}
      </div>
    </fieldset>
  );
}
