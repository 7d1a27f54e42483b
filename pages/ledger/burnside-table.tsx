import { cx, Section } from '#renderer/ui/index.ts';
import type { LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { burnsideSum } from './burnside-sum.ts';

const text = ledgerText.burnside;
const TURNS = [0, 1, 2, 3] as const;

/** How many states each pair of turns leaves as they are: rows by the turn before, columns by the one after. */
export function BurnsideTable({ view: { burnside, cases } }: { view: LedgerView }) {
  return (
    <Section title={text.title} className="min-w-0">
      <table className="w-full max-w-[30rem] border-collapse">
        <caption className="sr-only">{text.caption}</caption>
        <thead className="text-sm text-ink-2">
          <tr>
            <td />
            <th scope="colgroup" colSpan={4} className="border-b border-line pb-1 text-center font-normal">
              {text.after}
            </th>
          </tr>
          <tr className="rule-b">
            <th scope="col" className="pb-2 pt-1 text-start font-normal">
              {text.before}
            </th>
            {TURNS.map((after) => (
              <th key={after} scope="col" className="w-1/6 pb-2 ps-3 pt-1 text-end font-bold text-ink">
                {text.turn(after)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {TURNS.map((before) => (
            <tr key={before} className="border-b border-hair">
              <th scope="row" className="py-2 text-start font-bold">
                {text.turn(before)}
              </th>
              {TURNS.map((after) => {
                const fixed = burnside[before * 4 + after] ?? 0;
                return (
                  <td key={after} className={cx('py-2 ps-3 text-end', fixed === 0 && 'text-ink-2')}>
                    {ledgerText.whole(fixed)}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-3">{text.sum(burnsideSum(burnside), cases)}</p>
      <p className="mt-1 max-w-[30rem] text-[0.9375rem] text-ink-2">{text.note}</p>
    </Section>
  );
}
