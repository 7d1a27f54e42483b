import { expect, it } from 'vitest';
import { keeping } from '#server/services/ledger/kept.ts';

it('keeps the answers asked for last, and makes the others again', () => {
  const keep = keeping<string>(2);
  const made: string[] = [];
  const ask = (question: string) =>
    keep(question, () => {
      made.push(question);
      return question.toUpperCase();
    });
  expect([ask('a'), ask('b'), ask('a'), ask('c')]).toEqual(['A', 'B', 'A', 'C']);
  // b was asked for longest ago, so it went.
  expect([ask('a'), ask('c'), ask('b')]).toEqual(['A', 'C', 'B']);
  expect(made).toEqual(['a', 'b', 'c', 'b']);
});
