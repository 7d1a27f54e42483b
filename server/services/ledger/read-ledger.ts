import type { LedgerInput, LedgerView } from '#shared/contracts/ledger.ts';
import { CASE_SETS, type Ledger, openIn } from '#shared/lastlayer/index.ts';
import type { Ctx } from '../context.ts';
import { mixPriors } from './mix-priors.ts';
import { countStep, SHOWN, showCase } from './step-cases.ts';

/** The counts of a step, for anyone: nothing of it belongs to somebody. */
export async function readLedger(_ctx: Ctx, input: LedgerInput): Promise<LedgerView> {
  const { ledger, trade, cases } = countStep(input);
  const { entry, aspects, seen } = ledger;
  return {
    entry,
    aspects: [...aspects],
    seen: [...seen],
    entryStates: ledger.entryStates,
    trade,
    assemblies: plain(ledger.assemblies),
    solvable: plain(ledger.solvable),
    withoutAufAfter: plain(ledger.withoutAufAfter),
    cases: ledger.cases.value,
    tradeSets: CASE_SETS.filter((set) => set.entry === entry).map((set) => ({
      name: set.name,
      aspects: openIn(set),
    })),
    classes: ledger.classes
      .map(({ angles, prior, dealtOnceIn, caseNumbers }) => ({
        angles,
        cases: caseNumbers.length,
        prior,
        dealtOnceIn,
        shown: caseNumbers.slice(0, SHOWN).map((number) => showCase(cases[number]!, seen)),
      }))
      .reverse(),
    of: commonDenominator(ledger),
    burnside: ledger.burnside.map(({ fixed }) => fixed),
    upToMirror: ledger.upToMirror,
    upToInverse: ledger.upToInverse,
    upToMirrorAndInverse: ledger.upToMirrorAndInverse,
    mix:
      input.with !== undefined && input.share !== undefined
        ? mixPriors(input, input.with, input.share)
        : null,
  };
}

const plain = ({ value, factors, divisors }: Ledger['solvable']) => ({
  value,
  factors: [...factors],
  divisors: [...divisors],
});

/** Priors over this one are whole numbers: the skip has but one angle, so its prior is one in that many. */
const commonDenominator = ({ classes }: Ledger): number =>
  Math.max(...classes.map(({ prior }) => prior.denominator));
