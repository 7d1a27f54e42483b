import { describe, expect, it } from 'vitest';
import { rank, teamFigure } from '#shared/standing/index.ts';

describe('team figure', () => {
  it('is the mean of the active members, drawn towards everyone’s', () => {
    const team = teamFigure(
      [
        { theta: 0.9, se: 0.03 },
        { theta: 0.7, se: 0.04 },
      ],
      0.6,
    );
    // Derived: mean .8; √(.0009 + .0016)/2; (1.6 + 3·.6)/5; .025·2/5.
    expect(team.members).toBe(2);
    expect(team.mean).toBeCloseTo(0.8, 12);
    expect(team.se).toBeCloseTo(0.025, 12);
    expect(team.shrunk).toBeCloseTo(0.68, 12);
    expect(team.shrunkSe).toBeCloseTo(0.01, 12);
  });

  it('does not let one strong member beat a strong squad', () => {
    const one = teamFigure([{ theta: 0.95, se: 0.02 }], 0.6);
    const squad = teamFigure(
      Array.from({ length: 12 }, () => ({ theta: 0.85, se: 0.02 })),
      0.6,
    );
    expect(squad.shrunk).toBeGreaterThan(one.shrunk);
  });

  it('refuses a team without members', () => {
    expect(() => teamFigure([], 0.5)).toThrow('at least one active member');
  });
});

describe('ranks', () => {
  const rows = [
    { name: 'Ada', figure: 0.5 },
    { name: 'Bo', figure: 0.8 },
    { name: 'Cy', figure: 0.5 + 1e-12 },
    { name: 'Di', figure: 0.2 },
  ];

  it('share places on ties and skip the next', () => {
    const ranked = rank(
      rows,
      ({ figure }) => figure,
      (a, b) => a.name.localeCompare(b.name),
    );
    expect(ranked.map(({ row, rank: place }) => [row.name, place])).toEqual([
      ['Bo', 1],
      ['Ada', 2],
      ['Cy', 2],
      ['Di', 4],
    ]);
  });

  it('keep the order rows came in within a tie, and the rows as they are', () => {
    const ranked = rank(rows, () => 1);
    expect(ranked.map(({ row }) => row)).toEqual(rows);
    expect(ranked.every(({ rank: place }) => place === 1)).toBe(true);
    expect(rank([], () => 1)).toEqual([]);
  });

  it('refuse what is not a number', () => {
    expect(() => rank(rows, () => Number.NaN)).toThrow('needs a number');
  });
});
