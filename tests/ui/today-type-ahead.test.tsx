import { describe, expect, it } from 'vitest';
import { sayDate } from '#pages/member/say-date.ts';
import { readTyped } from '#pages/member/today/type-ahead.ts';

const pll = 'Aa Ab E F Ga Gb Gc Gd H Ja Jb Na Nb Ra Rb T Ua Ub V Y Z'.split(' ');
const keys = [
  ...pll.map((text) => ({ value: text, text, isName: true })),
  { value: 'solved', text: 'solved', isName: false },
  { value: 'lost', text: 'lost it', isName: false },
];
const at = (text: string) => keys.findIndex((key) => key.text === text);

describe('typing a name', () => {
  it('picks a name no other begins with', () => {
    expect(readTyped(keys, 't')).toEqual({ kind: 'pick', index: at('T') });
    expect(readTyped(keys, 'gb')).toEqual({ kind: 'pick', index: at('Gb') });
  });
  it('goes to the first of several, and waits', () => {
    expect(readTyped(keys, 'g')).toEqual({ kind: 'at', index: at('Ga') });
  });
  it('never presses "solved" or "lost it" for a letter: those send at once', () => {
    expect(readTyped(keys, 's')).toEqual({ kind: 'at', index: at('solved') });
    expect(readTyped(keys, 'l')).toEqual({ kind: 'at', index: at('lost it') });
  });
  it('knows when nothing is meant', () => {
    expect(readTyped(keys, 'q')).toEqual({ kind: 'none' });
    expect(readTyped(keys, '')).toEqual({ kind: 'none' });
  });
  it('waits at 2 where 21 may follow', () => {
    const numbers = ['2', '20', '21'].map((text) => ({ value: text, text, isName: true }));
    expect(readTyped(numbers, '2')).toEqual({ kind: 'at', index: 0 });
    expect(readTyped(numbers, '21')).toEqual({ kind: 'pick', index: 2 });
  });
});

describe('dates as people say them', () => {
  it.each([
    ['2026-11-30', 'today'],
    ['2026-12-01', 'today'],
    ['2026-12-02', 'tomorrow'],
    // 1 December 2026 is a Tuesday.
    ['2026-12-05', 'Saturday'],
    ['2026-12-08', '8 December'],
  ])('%s', (date, said) => {
    expect(sayDate(date, '2026-12-01')).toBe(said);
  });
});
