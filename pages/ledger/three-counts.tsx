import { Section } from '#renderer/ui/index.ts';
import type { LedgerClass, LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { gatheredTerms } from './burnside-sum.ts';

const text = ledgerText.three;

/** States counted by formula and by the cases' angles, cases by the lemma and one by one: twice two that agree. */
export function ThreeCounts({ view }: { view: LedgerView }) {
  const { solvable, withoutAufAfter, classes, burnside, cases } = view;
  const sumOf = (value: (one: LedgerClass) => number) => classes.reduce((sum, one) => sum + value(one), 0);
  const { what } = text;
  const lines = [
    {
      label: withoutAufAfter.value < solvable.value ? what.statesWithoutAuf : what.states,
      worked: text.states(ledgerText.formula(solvable), solvable.value, withoutAufAfter.value),
    },
    {
      label: what.statesAgain,
      worked: text.classes(
        classes,
        sumOf((one) => one.cases * one.angles),
      ),
    },
    { label: what.cases, worked: text.burnside(gatheredTerms(burnside), cases) },
    {
      label: what.casesAgain,
      worked: text.listed(
        classes,
        sumOf((one) => one.cases),
      ),
    },
  ];
  return (
    <Section title={text.title} className="keep-together">
      <dl className="grid gap-x-12 gap-y-4 md:grid-cols-2">
        {lines.map(({ label, worked }) => (
          <div key={label} className="min-w-0">
            <dt className="text-[0.9375rem] text-ink-2">{label}</dt>
            <dd className="text-[1.0625rem] tracking-[0.01em] sm:text-lg">{worked}</dd>
          </div>
        ))}
      </dl>
    </Section>
  );
}
