import { expect, it } from 'vitest';
import { sayFigure } from '#pages/desk/say-figure.ts';
import { meanOf, notBegun } from '#pages/desk/squad/squad-mean.ts';
import type { Figure } from '#shared/contracts/common.ts';
import type { SquadRow } from '#shared/contracts/desk.ts';

const figure = (value: number, rests: Figure['rests']): Figure => ({
  ...{ value, low: value, high: value },
  ...{ answers: rests === 'here' ? 12 : 0, few: true, rests },
});

function row(of: Figure | null): SquadRow {
  return {
    ...{ memberId: 'm', nickname: 'Ines', role: 'member', cells: [{ figure: of, change: null }] },
    ...{ answers: 0, lastTrained: null, minutesPerDay: 0 },
  };
}

it('the mean of a column is over those who have begun it, and says how many have not', () => {
  const rows = [
    row(figure(0.9, 'here')),
    row(figure(0.5, 'elsewhere')),
    row(figure(0, 'nothing')),
    row(null),
  ];
  // (0.9 + 0.5) / 2; who does not answer for the set is neither in it nor counted.
  expect(meanOf({ rows }, 0)).toBeCloseTo(0.7, 12);
  expect(notBegun({ rows }, 0)).toBe(1);
  expect(meanOf({ rows: rows.slice(2) }, 0)).toBeNull();
});

it('a figure is said with what it rests on', () => {
  expect(sayFigure(figure(0, 'nothing'))).toBe('not begun');
  expect(sayFigure(figure(0.5, 'elsewhere'))).toBe('50%, between 50% and 50%, from answers in another set');
  expect(sayFigure(figure(0.5, 'here'))).toBe('50%, between 50% and 50%, 12 answers');
});
