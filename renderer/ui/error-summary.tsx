import { type Ref, useEffect, useImperativeHandle, useRef } from 'react';

export interface FieldError {
  /** The id of the field the error is about. */
  readonly fieldId: string;
  /** The same words as at the field. */
  readonly message: string;
}

export interface ErrorSummaryProps {
  readonly title: string;
  readonly errors: readonly FieldError[];
  readonly ref?: Ref<HTMLDivElement>;
}

/**
 * All errors of a form at its top, each a link to its field. It takes the focus when it appears;
 * without scripts the links still lead to the fields. Renders nothing for no errors.
 */
export function ErrorSummary({ title, errors, ref }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  useImperativeHandle(ref, () => box.current as HTMLDivElement);
  const shown = errors.map(({ fieldId, message }) => `${fieldId} ${message}`).join('\n');
  useEffect(() => {
    if (shown) box.current?.focus();
  }, [shown]);
  if (errors.length === 0) return null;
  return (
    <div ref={box} tabIndex={-1} role="alert" className="border-4 border-rose bg-sheet p-4">
      <h2 className="text-lg font-bold">{title}</h2>
      <ul className="mt-2 space-y-1">
        {errors.map(({ fieldId, message }) => (
          <li key={`${fieldId} ${message}`}>
            <a
              href={`#${fieldId}`}
              className="font-bold text-rose underline underline-offset-4"
              onClick={(event) => {
                const target = document.getElementById(fieldId);
                if (!target) return;
                event.preventDefault();
                target.scrollIntoView({ block: 'center' });
                target.focus({ preventScroll: true });
              }}
            >
              {message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}
