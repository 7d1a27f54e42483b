import type { ButtonHTMLAttributes, ReactNode } from 'react';
import { cx } from './cx.ts';
import { AppLink, type AppLinkProps } from './link.tsx';

/** `filled` is what one does next; `outlined` what one may do; `plain` reads as a link. */
export type ButtonKind = 'filled' | 'outlined' | 'plain';
export type ButtonSize = 'small' | 'normal' | 'wide' | 'half-screen';

interface Look {
  readonly kind?: ButtonKind;
  readonly size?: ButtonSize;
  /** For what cannot be undone. */
  readonly tone?: 'ink' | 'rose';
}

const SIZES: Readonly<Record<ButtonSize, string>> = {
  small: 'min-h-12 px-3 text-sm sm:min-h-9',
  normal: 'min-h-12 px-5',
  wide: 'min-h-14 w-full px-5 text-lg',
  'half-screen': 'min-h-[11.5rem] w-full px-5 text-[1.75rem]',
};

function look({ kind = 'filled', size = 'normal', tone = 'ink' }: Look, blocked = false): string {
  const shape =
    'screen-only inline-flex flex-col items-center justify-center rounded-key text-center leading-tight';
  if (blocked) {
    return cx(shape, SIZES[size], 'border-[1.5px] border-dashed border-ink-2 bg-sheet font-bold text-ink-2');
  }
  if (kind === 'plain') {
    return cx(
      shape,
      size === 'small' ? 'min-h-12 text-sm sm:min-h-9' : 'min-h-12',
      'text-ink-2 underline underline-offset-4 hover:text-ink',
    );
  }
  if (kind === 'filled') {
    return cx(
      shape,
      SIZES[size],
      'border-[1.5px] font-bold text-paper active:opacity-85',
      tone === 'rose' ? 'border-rose bg-rose' : 'border-ink bg-ink',
    );
  }
  return cx(
    shape,
    SIZES[size],
    'border-[1.5px] bg-sheet font-bold hover:bg-hair active:bg-line',
    tone === 'rose' ? 'border-rose text-rose' : 'border-ink text-ink',
  );
}

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement>, Look {
  /** A second, quieter line on the key. */
  readonly hint?: ReactNode;
  /**
   * Nothing happens yet; the label says what is missing. The key stays in the tab order, so that
   * everyone can find out why.
   */
  readonly blocked?: boolean;
  /** Work is under way: the key keeps its place and takes no second press. `disabled` means the same. */
  readonly busy?: boolean;
}

/** A key. `type` is `button` unless given. */
export function Button({
  kind,
  size,
  tone,
  hint,
  blocked = false,
  busy = false,
  disabled = false,
  className,
  children,
  type = 'button',
  onClick,
  ...rest
}: ButtonProps) {
  const waiting = busy || disabled;
  const idle = blocked || waiting;
  return (
    <button
      {...rest}
      type={idle ? 'button' : type}
      aria-disabled={idle || undefined}
      aria-busy={waiting || undefined}
      onClick={idle ? undefined : onClick}
      className={cx(look({ kind, size, tone }, blocked), waiting && 'opacity-85', className)}
    >
      <span>{children}</span>
      {hint && <span className="mt-2 text-[0.9375rem] font-normal opacity-90">{hint}</span>}
    </button>
  );
}

/** A link that looks like a key: it goes somewhere, or downloads. */
export function LinkButton({ kind, size, tone, className, children, ...rest }: AppLinkProps & Look) {
  return (
    <AppLink {...rest} className={cx(look({ kind, size, tone }), className)}>
      {children}
    </AppLink>
  );
}
