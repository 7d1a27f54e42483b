import { AppLink, cx } from '#renderer/ui/index.ts';

export interface ChooserChoice {
  readonly href: string;
  readonly label: string;
  readonly current: boolean;
}

/** One of several views of the same thing, each at its own address. */
export function Chooser({ label, choices }: { label: string; choices: readonly ChooserChoice[] }) {
  return (
    <nav aria-label={label} className="screen-only mb-5 flex flex-wrap items-stretch gap-x-5 gap-y-1">
      {choices.map(({ href, label: name, current }) => (
        <AppLink
          key={href}
          href={href}
          aria-current={current ? 'page' : undefined}
          className={cx(
            'flex min-h-12 items-center border-y-2 border-transparent sm:min-h-9',
            current ? 'border-b-ink font-bold' : 'text-ink-2 hover:text-ink hover:underline',
          )}
        >
          {name}
        </AppLink>
      ))}
    </nav>
  );
}
