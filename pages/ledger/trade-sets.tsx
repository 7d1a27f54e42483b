import { useCall } from '#renderer/api.ts';
import { cx, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { LedgerInput } from '#shared/contracts/ledger.ts';
import type { Aspect } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { doneOn } from './done.ts';
import { type LedgerForm, ledgerHref } from './ledger-query.ts';

/** The trade's sets for the entry that is chosen: each one press away, whatever was told apart before. */
export function TradeSets({ asked, input }: { asked: LedgerForm; input: LedgerInput }) {
  const { data: view } = useCall(endpoints.ledger, input, { keepWhileLoading: true });
  if (!view || view.entry !== asked.entry || view.tradeSets.length === 0) return null;
  const done = doneOn(asked.entry);
  const open = (aspects: readonly Aspect[]) => aspects.filter((one) => !done.includes(one)).join();
  return (
    <p className="flex flex-wrap items-center gap-x-4 text-[0.9375rem]">
      <span className="text-ink-2">{ledgerText.form.tradeSets}</span>
      {view.tradeSets.map(({ name, aspects }) => {
        const here = open(aspects) === open(asked.aspects);
        return (
          <TextLink
            key={name}
            href={ledgerHref({ ...asked, aspects })}
            aria-current={here ? 'true' : undefined}
            className={cx('inline-flex min-h-12 items-center', here && 'font-bold')}
          >
            {name}
          </TextLink>
        );
      })}
    </p>
  );
}
