import { AppLink, cx } from '#renderer/ui/index.ts';
import type { DraftLine } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { isShown, SHOWS, type Show } from './line-filter.ts';

const text = intakeText.draft;

/** Which lines are shown, each choice with how many there are. */
export function FilterLinks({
  lines,
  open,
  show,
  hrefOf,
}: {
  lines: readonly DraftLine[];
  /** Nothing of a closed draft is to settle. */
  open: boolean;
  show: Show;
  hrefOf: (show: Show) => string;
}) {
  const choices = SHOWS.filter((one) => open || one === show || (one !== 'settle' && one !== 'cannot'));
  return (
    <nav aria-label={text.filterLabel} className="screen-only flex flex-wrap gap-x-6">
      {choices.map((one) => (
        <AppLink
          key={one}
          href={hrefOf(one)}
          aria-current={one === show ? 'true' : undefined}
          className={cx(
            'inline-flex min-h-12 items-center gap-2',
            one === show ? 'font-bold text-ink' : 'text-ink-2 hover:text-ink',
          )}
        >
          <span className={one === show ? 'border-b-2 border-ink' : 'underline underline-offset-4'}>
            {text.filters[one]}
          </span>
          {intakeText.grouped(lines.filter((line) => isShown(line, one)).length)}
        </AppLink>
      ))}
    </nav>
  );
}
