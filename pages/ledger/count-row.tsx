import type { LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { burnsideSum } from './burnside-sum.ts';

const { counts, formula, powers, whole } = ledgerText;

/** The four numbers of a step, each with its formula filled in. */
export function CountRow({ view }: { view: LedgerView }) {
  const { assemblies, solvable, withoutAufAfter, cases } = view;
  const four = [
    { ...assemblies, label: counts.assemblies, worked: powers(assemblies.factors) },
    { ...solvable, label: counts.solvable, worked: formula({ ...solvable, factors: [assemblies.value] }) },
    {
      ...withoutAufAfter,
      label: counts.withoutAuf,
      worked: withoutAufAfter.divisors.length > 0 ? formula(withoutAufAfter) : counts.noPermutation,
    },
    {
      value: cases,
      label: cases === 1 ? counts.caseAlone : counts.cases,
      worked: formula({ factors: [burnsideSum(view.burnside)], divisors: [16] }),
    },
  ];
  return (
    <dl className="rule-t grid grid-cols-2 gap-x-6 gap-y-5 border-b border-b-hair pb-6 pt-4 sm:grid-cols-4">
      {four.map(({ value, label, worked }) => (
        <div key={label} className="flex min-w-0 flex-col">
          <dt className="order-2 text-[0.9375rem] text-ink-2">{label}</dt>
          <dd className="order-1 text-[2rem] font-bold leading-tight tracking-[0.01em] sm:text-[2.5rem]">
            {whole(value)}
          </dd>
          <dd className="order-3 mt-1 text-sm text-ink-2">{worked}</dd>
        </div>
      ))}
    </dl>
  );
}
