import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { LookingScreen } from '#pages/member/today/looking-screen.tsx';
import { NamingScreen } from '#pages/member/today/naming-screen.tsx';
import { ReadyScreen } from '#pages/member/today/ready-screen.tsx';
import type { AnswerKey, Showing } from '#shared/contracts/today.ts';
import { type CaseOfSet, type CaseSet, caseSet } from '#shared/lastlayer/index.ts';
import { stickersOf } from '#shared/lastlayer/pictures/index.ts';
import { blanked, seededRandom } from './today-support.ts';

/** States drawn for each case: angles and AUFs vary, the markup must not. */
const DRAWS = 6;
const ignore = () => {};

function showingOf(set: CaseSet, c: CaseOfSet, random: () => number, k: number): Showing {
  return {
    id: `00000000-0000-7000-8000-${String(c.number * 100 + k).padStart(12, '0')}`,
    setKey: set.definition.key,
    grid: c.cluster === 0 ? 'all' : `c${c.cluster}`,
    picture: { stickers: stickersOf(set.drawState(c, random)), colouring: k * 3 },
    limitMs: 3000,
    asksAuf: true,
    issuedAt: 0,
  };
}

/** The recognition screen as Today puts it up for a showing. */
function looking(showing: Showing, holding: 'right' | 'left'): string {
  return renderToStaticMarkup(
    <LookingScreen
      key={showing.id}
      picture={showing.picture}
      holding={holding}
      progress={{ answered: 14, planned: 32 }}
      passing={null}
      onGotIt={ignore}
      onNotRecognised={ignore}
    />,
  );
}

describe.each(['pll', 'oll'])('before the answer, every case of %s', (setKey) => {
  const set = caseSet(setKey);
  const random = seededRandom(16);
  const showings = set.cases.flatMap((c) =>
    Array.from({ length: DRAWS }, (_, k) => ({ c, showing: showingOf(set, c, random, k) })),
  );

  it.each(['right', 'left'] as const)('has the same markup but for the stickers, holding %s', (holding) => {
    const seen = new Set(showings.map(({ showing }) => blanked(looking(showing, holding))));
    expect(showings).toHaveLength(set.cases.length * DRAWS);
    expect(seen.size).toBe(1);
  });

  it('names neither the case nor the showing', () => {
    for (const { c, showing } of showings) {
      const markup = looking(showing, 'right');
      expect(markup).not.toContain(c.key);
      expect(markup).not.toContain(showing.id.slice(-6));
    }
  });

  it('offers the same grid of names to every case of its cluster', () => {
    const keys = (c: CaseOfSet): AnswerKey[] =>
      set.cases
        .filter((other) => other.cluster === c.cluster)
        .map((other) => ({ key: other.key, label: other.name, tradeName: null, algorithm: "R U R' U'" }));
    const byGrid = new Map<string, Set<string>>();
    for (const { c, showing } of showings) {
      const markup = renderToStaticMarkup(
        <NamingScreen
          keys={keys(c)}
          grid={showing.grid}
          asksAuf={showing.asksAuf}
          recognitionMs={1800}
          onChoose={ignore}
        />,
      );
      byGrid.set(showing.grid, (byGrid.get(showing.grid) ?? new Set()).add(markup));
    }
    for (const markups of byGrid.values()) expect(markups.size).toBe(1);
  });
});

describe('the comparison itself', () => {
  const set = caseSet('pll');
  const [first, second] = set.cases;
  if (!first || !second) throw new Error('PLL has cases.');
  const one = showingOf(set, first, seededRandom(1), 0);
  const other = showingOf(set, second, seededRandom(2), 0);

  it('sees the stickers before blanking', () => {
    expect(looking(one, 'right')).not.toBe(looking(other, 'right'));
  });

  it.each([
    ['a name', (markup: string, c: CaseOfSet) => markup.replace('<svg', `<svg data-case="${c.name}"`)],
    ['a prior in words', (markup: string, c: CaseOfSet) => `${markup}<p>1 in ${c.number}</p>`],
    ['a class', (markup: string, c: CaseOfSet) => markup.replace('class="', `class="k${c.number} `)],
    ['a sticker more', (markup: string, c: CaseOfSet) => (c === first ? `${markup}<path/>` : markup)],
    [
      'a piece less in the text form',
      (markup: string, c: CaseOfSet) => (c === first ? markup.replace(/Front edge:[^.]*\./, '') : markup),
    ],
  ])('is not blind to %s', (_what, poison) => {
    expect(blanked(poison(looking(one, 'right'), first))).not.toBe(
      blanked(poison(looking(other, 'right'), second)),
    );
  });
});

describe('the screen before the first picture', () => {
  it('shows no picture: the clock has not started', () => {
    const markup = renderToStaticMarkup(
      <ReadyScreen
        club="Harbour Lane Cubers"
        setNames={['PLL']}
        progress={{ answered: 0, planned: 32 }}
        secondsLeft={240}
        note={null}
        onBegin={ignore}
      />,
    );
    expect(markup).not.toContain('seat-view');
    expect(markup).toContain('32 showings');
  });
});
