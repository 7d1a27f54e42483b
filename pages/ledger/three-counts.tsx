import { Section } from '#renderer/ui/index.ts';
import type { LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { gatheredTerms } from './burnside-sum.ts';

const text = ledgerText.three;

/** States counted by formula, by the cases' angles, and cases by the lemma: each line ends where another begins. */
export function ThreeCounts({ view }: { view: LedgerView }) {
  const { solvable, withoutAufAfter, classes, burnside, cases } = view;
  const lines = [
    text.states(ledgerText.formula(solvable), solvable.value, withoutAufAfter.value),
    text.classes(
      classes,
      classes.reduce((sum, one) => sum + one.cases * one.angles, 0),
    ),
    text.burnside(gatheredTerms(burnside), cases),
  ];
  return (
    <Section title={text.title} className="keep-together">
      <ol className="space-y-2 text-[1.0625rem] tracking-[0.01em] sm:text-lg">
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ol>
    </Section>
  );
}
