import type { Fraction, ShownCase } from '#shared/contracts/ledger.ts';
import {
  type Aspect,
  buildCaseSet,
  type CaseOfSet,
  type CaseSet,
  caseSet,
  type Entry,
  fraction,
  type Ledger,
  ledgerOf,
  openIn,
  seenThrough,
  tradeSetLike,
} from '#shared/lastlayer/index.ts';
import { maskStickers, stickersOf, TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { keeping } from './kept.ts';

/** What is done on arrival and what is told apart. */
export interface Step {
  readonly entry: Entry;
  readonly aspects: readonly Aspect[];
}

export type StepCase = Omit<CaseOfSet, 'cluster'>;

/** Everything the Ledger knows of a step. */
export interface CountedStep {
  readonly ledger: Ledger;
  /** The trade's set with the same cases. */
  readonly trade: { readonly key: string; readonly name: string } | null;
  /** In canonical order, the skip first: a case's number is its place. */
  readonly cases: readonly StepCase[];
}

const keep = keeping<CountedStep>(64);

/** Counts a step; some tens of milliseconds for one that has not been asked for lately. */
export function countStep({ entry, aspects }: Step): CountedStep {
  return keep(`${entry} ${aspects.join()}`, () => {
    const ledger = ledgerOf(entry, aspects);
    const set = setOf(entry, aspects);
    const trade = tradeSetLike({ entry, toldApart: aspects });
    return {
      ledger,
      trade: trade && set ? { key: trade.key, name: trade.name } : null,
      cases: set ? [set.skip, ...set.cases] : [theOnlyCase(ledger)],
    };
  });
}

/**
 * The cases of a step as a set that solves all it sees; the trade's own where there is one, so that names and keys
 * are the same. Null where nothing is told apart.
 */
function setOf(entry: Entry, toldApart: readonly Aspect[]): CaseSet | null {
  if (openIn({ entry, toldApart }).length === 0) return null;
  const trade = tradeSetLike({ entry, toldApart });
  if (trade) return caseSet(trade.key);
  const solved = seenThrough(entry, toldApart);
  return buildCaseSet({ key: 'step', name: 'Step', entry, toldApart, solved, mix: [] });
}

/** Where nothing is told apart every state is the same case. */
function theOnlyCase({ entryStates }: Ledger): StepCase {
  const nothing = { key: '', number: 0, name: 'skip', group: '', skip: true } as const;
  return { ...nothing, canonical: 0, weight: entryStates, angles: 1 };
}

/** A case as tables show it: from its canonical angle, in the usual colours, what is not seen hatched. */
export function showCase({ number, name, canonical }: StepCase, seen: readonly Aspect[]): ShownCase {
  const stickers = maskStickers(stickersOf(canonical), seen);
  return { number, name, picture: { stickers, colouring: TABLE_COLOURING } };
}

export const priorOf = ({ weight }: StepCase, { entryStates }: Ledger): Fraction =>
  fraction(weight, entryStates);

/** How many cases a table shows before it leads to the list of all. */
export const SHOWN = 6;
