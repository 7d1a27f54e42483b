import type { Fraction, LedgerView, MixClass } from '#shared/contracts/ledger.ts';
import {
  buildCaseSet,
  type CaseOfSet,
  type CaseSet,
  type Entry,
  fraction,
  isEntryState,
  meetOf,
  openIn,
  STATES,
  seenThrough,
} from '#shared/lastlayer/index.ts';
import { keeping } from './kept.ts';
import { SHOWN, type Step, showCase } from './step-cases.ts';

type Mix = NonNullable<LedgerView['mix']>;

const keep = keeping<Mix>(64);
const NONE: Fraction = { numerator: 0, denominator: 1 };
const CERTAIN: Fraction = { numerator: 1, denominator: 1 };

/**
 * Priors of one who arrives with `second` in `share` of 100 solves and with the step's own entry in the others. The
 * cases are those of what both have in common; told apart is the same for both.
 */
export function mixPriors(step: Step, second: Entry, share: number): Mix {
  return keep(`${step.entry} ${step.aspects.join()} ${second} ${share}`, () => {
    const entry = meetOf([step.entry, second]);
    const toldApart = step.aspects;
    if (openIn({ entry, toldApart }).length === 0)
      return { with: second, share, cases: 1, classes: [onlyClass()] };
    const seen = seenThrough(entry, toldApart);
    const set = buildCaseSet({
      key: 'mix',
      name: 'Mix',
      entry,
      toldApart,
      solved: seen,
      mix: [
        { entry: step.entry, parts: 100 - share },
        { entry: second, parts: share },
      ],
    });
    const cases = [set.skip, ...set.cases];
    const priorsUnder = [priorsOf(set, step.entry), priorsOf(set, second)] as const;
    const classes = new Map<
      string,
      { cases: CaseOfSet[]; first: Fraction; second: Fraction; mixed: Fraction }
    >();
    for (const one of cases) {
      const [first, second] = [priorsUnder[0](one), priorsUnder[1](one)];
      const mixed = fraction(one.weight, set.total);
      const kind = [first, second].map((p) => `${p.numerator}/${p.denominator}`).join(' ');
      const known = classes.get(kind);
      if (known) known.cases.push(one);
      else classes.set(kind, { cases: [one], first, second, mixed });
    }
    return {
      with: second,
      share,
      cases: cases.length,
      classes: [...classes.values()]
        .sort((a, b) => asNumber(b.mixed) - asNumber(a.mixed))
        .map(({ cases: alike, mixed, ...under }) => ({
          ...under,
          mixed,
          dealtOnceIn: { numerator: mixed.denominator, denominator: mixed.numerator },
          cases: alike.length,
          shown: alike.slice(0, SHOWN).map((one) => showCase(one, seen)),
        })),
    };
  });
}

const asNumber = ({ numerator, denominator }: Fraction): number => numerator / denominator;

/** The priors of a mix's cases for the solves that arrive with one of its entries. */
function priorsOf(set: CaseSet, entry: Entry): (of: CaseOfSet) => Fraction {
  const dealt: number[] = [];
  let states = 0;
  for (let index = 0; index < STATES; index++) {
    if (!isEntryState(entry, index)) continue;
    states++;
    const number = set.caseOfState(index)?.number ?? 0;
    dealt[number] = (dealt[number] ?? 0) + 1;
  }
  return ({ number }) => (dealt[number] ? fraction(dealt[number], states) : NONE);
}

/** Where nothing is told apart: whatever the mix, the one case is certain. */
function onlyClass(): MixClass {
  return { cases: 1, first: CERTAIN, second: CERTAIN, mixed: CERTAIN, dealtOnceIn: CERTAIN, shown: [] };
}
