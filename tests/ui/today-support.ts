import type { AnswerInput, Showing, TodayView, Verdict } from '#shared/contracts/today.ts';
import { pictureText } from '#shared/text/pictures.ts';

/** mulberry32, a 32-bit generator in the public domain (Tommy Ettinger): the same draws on every run. */
export function seededRandom(seed: number): () => number {
  let a = seed >>> 0;
  return () => {
    a = (a + 0x6d2b79f5) >>> 0;
    let t = a;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296;
  };
}

const sides = Object.values(pictureText.sides).join('|');
const letters = Object.values(pictureText.letters).join('|');

/** Markup without what may differ between two pictures: colours of stickers, and their letters in the text form. */
export function blanked(markup: string): string {
  return markup
    .replace(/ (fill|stroke)="(#[0-9A-Fa-f]{6}|none)"/g, ' $1=""')
    .replace(new RegExp(`\\b(${sides}) (${letters})\\b`, 'g'), '$1 *');
}

export function uuidOf(k: number): string {
  return `00000000-0000-7000-8000-${String(k).padStart(12, '0')}`;
}

/** A showing of anything: the sitting does not look at the picture. */
export function someShowing(k: number): Showing {
  return {
    id: uuidOf(k),
    setKey: 'pll',
    grid: 'all',
    picture: {
      stickers: { top: 'UUUUUUUUU', front: 'FFF', right: 'RRR', back: 'BBB', left: 'LLL' },
      colouring: 0,
    },
    limitMs: 3000,
    asksAuf: true,
    issuedAt: 0,
  };
}

export function someView(showings: readonly number[], more: Partial<TodayView> = {}): TodayView {
  return {
    date: '2026-12-01',
    localDay: 20_788,
    serverNow: 0,
    planned: showings.length,
    answered: 0,
    secondsLeft: 60,
    holding: 'right',
    sets: [{ setKey: 'pll', name: 'PLL', edition: 1, grids: { all: [] } }],
    showings: showings.map(someShowing),
    empty: showings.length > 0 ? null : 'done',
    summary: null,
    ...more,
  };
}

export function someAnswer(k: number, more: Partial<AnswerInput> = {}): AnswerInput {
  return {
    id: uuidOf(1_000 + k),
    showingId: uuidOf(k),
    named: 'pll.t',
    aufBefore: 0,
    recognitionMs: 1_800,
    namingMs: 900,
    answeredAt: 1_000 * k,
    ...more,
  };
}

export function someVerdict(k: number, outcome: Verdict['outcome'], more: Partial<Verdict> = {}): Verdict {
  return {
    id: uuidOf(1_000 + k),
    status: 'stored',
    outcome,
    caseRight: outcome !== 'missed',
    aufRight: outcome !== 'missed' ? true : null,
    scored: true,
    unscoredReason: null,
    recognitionMs: 1_800,
    limitMs: 3_000,
    was: {
      key: 'pll.t',
      name: 'T',
      setName: 'PLL',
      picture: someShowing(k).picture,
      algorithm: "R U R' U' R' F R2 U' R' U' R U R' F'",
      rightAufs: [3],
    },
    named: null,
    differsAt: null,
    lostBy: null,
    back: { thisSitting: outcome === 'missed', date: '2026-12-02' },
    state: 'settling',
    ...more,
  };
}
