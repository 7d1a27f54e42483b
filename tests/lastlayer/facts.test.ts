import { describe, expect, it } from 'vitest';
import {
  type CaseOfSet,
  type CaseSet,
  caseSet,
  fraction,
  isSolvedIn,
  ledgerOf,
  readAlgorithm,
  STATES,
  stateAt,
} from '#shared/lastlayer/index.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';

/** Everything here is common practice unless it says otherwise: what every cuber knows. */

function stateOf(algorithm: string): number {
  const read = readAlgorithm(algorithm);
  if (read.kind !== 'state') throw new Error(`${algorithm} is ${read.kind}`);
  return read.state;
}
const prior = (set: CaseSet, one: CaseOfSet): string => {
  const { numerator, denominator } = fraction(one.weight, set.total);
  return `${numerator}/${denominator}`;
};
/** How often an algorithm is done until the cube is as it was. */
function order(algorithm: string): number {
  for (let times = 1; times <= 360; times++)
    if (stateOf(Array(times).fill(algorithm).join(' ')) === 0) return times;
  throw new Error(`${algorithm} comes round too late.`);
}
const PLL = new Map(PLL_NAMES);

describe('what every cuber knows of chances', () => {
  it.each([
    ['oll', '1/216'],
    ['pll', '1/72'],
    ['ocll', '1/27'],
    ['eoll', '1/8'],
    ['cpll', '1/6'],
    ['epll', '1/12'],
    ['coll', '1/162'],
    ['zbll', '1/1944'],
    ['1lll', '1/15552'],
  ])('%s is skipped %s of the time', (key, chance) => {
    expect(prior(caseSet(key), caseSet(key).skip)).toBe(chance);
  });

  it('a T is dealt once in 18 solves, an E once in 36, an H once in 72', () => {
    const pll = caseSet('pll');
    expect(['T', 'E', 'H'].map((name) => prior(pll, pll.byName(name)!))).toEqual(['1/18', '1/36', '1/72']);
  });

  it('two corners beside each other are swapped in two of three solves, across from each other in one of six', () => {
    const cpll = caseSet('cpll');
    expect(['adjacent', 'diagonal'].map((name) => prior(cpll, cpll.byName(name)!))).toEqual(['2/3', '1/6']);
  });

  it('half of all solves come with two flipped edges beside each other, a quarter with two across, an eighth with a dot', () => {
    const eoll = caseSet('eoll');
    expect(['L', 'line', 'dot'].map((name) => prior(eoll, eoll.byName(name)!))).toEqual([
      '1/2',
      '1/4',
      '1/8',
    ]);
  });

  it('of orientations all but five and the two that look alike from everywhere come once in 54', () => {
    expect(ledgerOf('any', ['co', 'eo']).classes.map((one) => [one.cases, one.dealtOnceIn])).toEqual([
      [2, { numerator: 216, denominator: 1 }],
      [5, { numerator: 108, denominator: 1 }],
      [51, { numerator: 54, denominator: 1 }],
    ]);
  });
});

describe('what every cuber knows of algorithms', () => {
  it.each([
    ["R U R' U R U2 R'", 6],
    ["R U2 R' U' R U' R'", 6],
    ["F R U R' U' F'", 6],
    [PLL.get('T')!, 2],
    [PLL.get('Y')!, 2],
    [PLL.get('H')!, 2],
    // These two leave the top a quarter turned, which has to be taken back.
    [`${PLL.get('Z')} U'`, 2],
    [`${PLL.get('Jb')} U'`, 2],
    [PLL.get('Ua')!, 3],
    [PLL.get('Aa')!, 3],
  ])('%s comes round after %i', (algorithm, times) => {
    expect(order(algorithm)).toBe(times);
  });

  it('Ua twice is Ub, and Aa twice is Ab', () => {
    const pll = caseSet('pll');
    for (const [one, other] of [
      ['Ua', 'Ub'],
      ['Aa', 'Ab'],
    ] as const)
      expect(pll.caseOfState(stateOf(`${PLL.get(one)} ${PLL.get(one)}`))?.name).toBe(other);
  });

  it('the letters that swap two corners and two edges are T F J R V Y N, and all others move threes or pairs', () => {
    const odd = PLL_NAMES.filter(([, algorithm]) => swapsTwo(algorithm)).map(([name]) => name);
    expect(odd).toEqual(['F', 'Ja', 'Jb', 'Na', 'Nb', 'Ra', 'Rb', 'T', 'V', 'Y']);
  });

  it('there are 62,208 last layers, and one in eight has its edges oriented', () => {
    let oriented = 0;
    for (let index = 0; index < STATES; index++) if (isSolvedIn(index, ['eo'])) oriented++;
    expect([STATES, oriented]).toEqual([62_208, 62_208 / 8]);
  });
});

/** Whether some turn of the top leaves exactly two corners and two edges out of place. */
function swapsTwo(algorithm: string): boolean {
  const { cp, ep } = stateAt(stateOf(algorithm));
  return [0, 1, 2, 3].some((turn) => {
    const astray = (pieces: readonly number[]) =>
      pieces.filter((piece, place) => piece !== ((place + turn) & 3)).length;
    return astray(cp) === 2 && astray(ep) === 2;
  });
}
