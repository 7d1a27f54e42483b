/** The last layer: reading algorithms against a general puzzle model, canonical form, cold counts, pictures. */
import { readFileSync } from 'node:fs';
import { Alg } from 'cubing/alg';
import { cube3x3x3 } from 'cubing/puzzles';
import { readCaseFile } from '#server/services/intake/read-case-file.ts';
import { classify } from '#shared/lastlayer/classes.ts';
import { ASPECTS, canonical, countCases, ENTRIES, readAlgorithm, STATES } from '#shared/lastlayer/index.ts';
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { stateSolved } from '#shared/lastlayer/reading.ts';
import { type Figure, milliseconds, ratesOf } from './bench.ts';
import { seeingFigures } from './seeing.ts';

const seedAlgorithms = (): string[] =>
  ['oll', 'pll'].flatMap((key) => {
    const file = new URL(`../../database/seed/case-sets/${key}.csv`, import.meta.url);
    return readCaseFile(readFileSync(file)).lines.map(({ algorithm }) => algorithm);
  });

/** The first count in the process, then the slowest of every entry with every choice of aspects. */
function countFigures(): Figure[] {
  const first = milliseconds(() => countCases('any', ASPECTS));
  let slowest = 0;
  for (const entry of ENTRIES)
    for (let choice = 1; choice < 16; choice++) {
      const aspects = ASPECTS.filter((_, at) => (choice >> at) & 1);
      slowest = Math.max(
        slowest,
        milliseconds(() => countCases(entry, aspects)),
      );
    }
  return [
    { name: 'first count (all aspects)', value: first, unit: 'ms' },
    { name: 'slowest count of 90 steps', value: slowest, unit: 'ms' },
  ];
}

async function readingFigures(): Promise<Figure[]> {
  const puzzle = await cube3x3x3.kpuzzle();
  const texts = seedAlgorithms();
  const moves = texts.map((text) => parseMoves(text));
  const algs = texts.map((text) => new Alg(text));
  const solved = puzzle.defaultPattern();
  const over =
    <T>(list: readonly T[], work: (one: T) => unknown) =>
    (): void => {
      for (const one of list) work(one);
    };
  const [ours, theirs, oursParsed, theirsParsed] = ratesOf([
    over(texts, (text) => readAlgorithm(text)),
    over(texts, (text) => solved.applyAlg(new Alg(text))),
    over(moves, (list) => stateSolved(list)),
    over(algs, (alg) => solved.applyAlg(alg)),
  ]).map((rate) => rate * texts.length) as [number, number, number, number];
  return [
    { name: 'read from text', value: ours, unit: 'algorithms/s' },
    { name: 'general model from text', value: theirs, unit: 'algorithms/s' },
    { name: 'read from text, times as fast', value: ours / theirs, unit: '×' },
    { name: 'read, parsed before', value: oursParsed, unit: 'algorithms/s' },
    { name: 'general model, parsed before', value: theirsParsed, unit: 'algorithms/s' },
    { name: 'read parsed, times as fast', value: oursParsed / theirsParsed, unit: '×' },
  ];
}

function canonicalFigures(): Figure[] {
  let cases = 0;
  const once = milliseconds(() => {
    for (let index = 0; index < STATES; index++) if (canonical(index) === index) cases++;
  });
  const table = classify('any', ASPECTS).caseOf;
  return [
    { name: 'canonical form of all 62,208 states', value: once, unit: 'ms' },
    { name: 'cases found so', value: cases, unit: '' },
    { name: 'table from state to case', value: table.byteLength / 1000, unit: 'kB' },
  ];
}

export async function bench(): Promise<Figure[]> {
  return [...countFigures(), ...(await readingFigures()), ...canonicalFigures(), ...seeingFigures()];
}
