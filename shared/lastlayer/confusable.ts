/** Which cases of a set are hardest to tell from a case, and the two views in which they come nearest. */
import { type Auf, act } from './action.ts';
import { seenThrough } from './aspects.ts';
import type { CaseOfSet, CaseSet } from './case-set.ts';
import { type Holding, stickersApart } from './seat-codes.ts';
import { type ViewCodes, viewCodes } from './view-distance.ts';

export interface Confusable {
  readonly case: CaseOfSet;
  /** Fewest visible stickers the two differ in, over angles, colours and holdings. */
  readonly distance: number;
  /** Full state of the case asked about in the view that comes nearest, 0..62207. */
  readonly shown: number;
  /** Full state of the other case in that view. */
  readonly other: number;
  /** How the cube is held in that view. */
  readonly holding: Holding;
  /** The other case is the mirror of the one asked about. */
  readonly mirror: boolean;
}

export interface ConfusableOptions {
  /** How many cases at most; 6 unless given. */
  readonly count?: number;
  /** The holdings looked at; both unless given. */
  readonly holdings?: readonly Holding[];
}

interface Views {
  /** The skip first. */
  readonly cases: readonly CaseOfSet[];
  readonly codes: Readonly<Record<Holding, ViewCodes>>;
}

/** 512 bytes a case: 2 MB for the full last layer. */
const made = new WeakMap<CaseSet, Views>();

function viewsOf(set: CaseSet): Views {
  const known = made.get(set);
  if (known) return known;
  const seen = seenThrough(set.definition.entry, set.definition.toldApart);
  const cases = [set.skip, ...set.cases];
  const states = cases.map(({ canonical }) => canonical);
  const codes = { right: viewCodes(seen, states, 'right'), left: viewCodes(seen, states, 'left') };
  const views = { cases, codes };
  made.set(set, views);
  return views;
}

/** Turns of a pair of views packed into one number: visible stickers apart first, those out of sight next. */
interface Nearest {
  cost: number;
  holding: Holding;
  before: Auf;
  turn: number;
}

/** The two views in which a pair of cases comes nearest: of equal ones the first angle, right before left. */
function nearest(
  { codes }: Views,
  one: number,
  other: number,
  holdings: readonly Holding[],
  best: Nearest,
): void {
  best.cost = Number.POSITIVE_INFINITY;
  for (const holding of holdings) {
    const { tops, sides, turns } = codes[holding];
    const far = codes[holding === 'right' ? 'left' : 'right'].sides;
    for (let before = 0; before < 4; before++) {
      const a = one * 16 + before;
      for (let turn = 0; turn < turns; turn++) {
        const b = other * 16 + turn;
        const visible = stickersApart(tops[a]!, tops[b]!) + stickersApart(sides[a]!, sides[b]!);
        if (visible * 16 > best.cost) continue;
        const cost = visible * 16 + stickersApart(far[a]!, far[b]!);
        if (cost >= best.cost) continue;
        best.cost = cost;
        best.holding = holding;
        best.before = before as Auf;
        best.turn = turn;
      }
    }
  }
}

/**
 * The cases of a set, the skip among them, that look most like one of its cases: by the fewest visible
 * stickers in which any two views of theirs differ, of what the set tells apart. Nearest first; of equally
 * near ones the mirror first, then in canonical order.
 * @throws RangeError if the case is not one of the set.
 */
export function confusableWith(
  set: CaseSet,
  of: CaseOfSet,
  { count = 6, holdings = ['right', 'left'] }: ConfusableOptions = {},
): readonly Confusable[] {
  const views = viewsOf(set);
  const one = views.cases.findIndex(({ key }) => key === of.key);
  if (one < 0) throw new RangeError(`${set.definition.name} has no case ${of.key}.`);
  const mirrored = set.mirrorOf(of).key;
  const best: Nearest = { cost: 0, holding: 'right', before: 0, turn: 0 };
  const found: Confusable[] = [];
  views.cases.forEach((other, at) => {
    if (at === one) return;
    nearest(views, one, at, holdings, best);
    found.push({
      case: other,
      distance: best.cost >> 4,
      shown: act(of.canonical, best.before, 0),
      other: act(other.canonical, (best.turn & 3) as Auf, (best.turn >> 2) as Auf),
      holding: best.holding,
      mirror: other.key === mirrored,
    });
  });
  found.sort(
    (a, b) => a.distance - b.distance || Number(b.mirror) - Number(a.mirror) || a.case.number - b.case.number,
  );
  return found.slice(0, count);
}
