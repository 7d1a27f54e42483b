import { expect, it } from 'vitest';
import { changesOf } from '#server/services/catalogue/case-changes.ts';

const edition = (number: number, ...algorithms: string[]) => ({
  edition: number,
  publishedAt: number * 1_000,
  algorithms,
});

it('names the editions in which something changed, newest first, and what', () => {
  expect(
    changesOf([
      edition(1),
      edition(2, 'A', 'B'),
      edition(3, 'A', 'B'),
      edition(4, 'B', 'A'),
      edition(5, 'B', 'C', 'A'),
      edition(6, 'C'),
    ]),
  ).toEqual([
    { edition: 6, publishedAt: 6_000, added: [], removed: ['B', 'A'], reordered: false },
    { edition: 5, publishedAt: 5_000, added: ['C'], removed: [], reordered: false },
    { edition: 4, publishedAt: 4_000, added: [], removed: [], reordered: true },
    { edition: 2, publishedAt: 2_000, added: ['A', 'B'], removed: [], reordered: false },
  ]);
});

it('has nothing to tell of a case that never had an algorithm', () => {
  expect(changesOf([edition(1), edition(2)])).toEqual([]);
});
