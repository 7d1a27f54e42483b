import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';
import { runCases } from '#server/cli/run-cases.ts';
import { ASPECTS, EVERY_ENTRY, ledgerOf } from '#shared/lastlayer/index.ts';

const ROOT = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'cases-'));
afterAll(() => rmSync(folder, { recursive: true }));

interface Ran {
  code: number;
  out: string;
  err: string;
}

function cases(...args: string[]): Ran {
  const [out, err]: [string[], string[]] = [[], []];
  const code = runCases(args, { out: (text) => out.push(text), err: (text) => err.push(text), folder });
  return { code, out: out.join('\n'), err: err.join('\n') };
}

/** The command as it is really started: its own process, from another folder. */
function started(...args: string[]): Promise<Ran> {
  return new Promise((resolve) => {
    execFile(
      process.execPath,
      ['--import', 'tsx', 'server/cli/cases.ts', ...args],
      { cwd: ROOT, env: { ...process.env, INIT_CWD: folder } },
      (error, out, err) => resolve({ code: typeof error?.code === 'number' ? error.code : 0, out, err }),
    );
  });
}

function file(name: string, text: string): string {
  writeFileSync(join(folder, name), text);
  return name;
}

const T = "R U R' U' R' F R2 U' R' U' R U R' F'";

describe('the cases command', () => {
  it('reads a file that agrees: exit code 0', () => {
    const { code, out, err } = cases(
      'read',
      `${ROOT}/database/seed/case-sets/pll.csv`,
      '--set',
      'PLL',
      '--json',
    );
    expect([code, err]).toEqual([0, '']);
    expect(JSON.parse(out)).toMatchObject({ set: 'PLL', covered: 21, of: 21 });
  });

  it('reads a file with findings: exit code 1, and the shape of its JSON', () => {
    const name = file(
      'mixed.csv',
      `case,algorithm\nT,"${T}"\nF,U2 ${T}\nJa,R U R' Q U'\n,${T}\nV,R\nT,R U R' U R U2 R'\nY,${T}\nH,U\n`,
    );
    const { code, out } = cases('read', name, '--set', 'pll', '--json');
    expect(code).toBe(1);
    expect(JSON.parse(out)).toEqual({
      set: 'PLL',
      rows: [
        { line: 2, case: 'T', algorithm: T, solves: 'T', finding: 'agrees' },
        { line: 3, case: 'F', algorithm: `U2 ${T}`, solves: 'T', finding: 'solves-other' },
        { line: 4, case: 'Ja', algorithm: "R U R' Q U'", solves: null, finding: 'not-a-move', column: 8 },
        { line: 5, case: '', algorithm: T, solves: 'T', finding: 'missing-field' },
        { line: 6, case: 'V', algorithm: 'R', solves: null, finding: 'first-two-layers-broken' },
        { line: 7, case: 'T', algorithm: "R U R' U R U2 R'", solves: null, finding: 'not-in-set' },
        { line: 8, case: 'Y', algorithm: T, solves: 'T', finding: 'duplicate' },
        { line: 9, case: 'H', algorithm: 'U', solves: 'skip', finding: 'solves-other' },
      ],
      covered: 1,
      of: 21,
    });
  });

  it('says the same in words', () => {
    const name = file('words.csv', `case,algorithm,speed\nF,${T},1\n`);
    const { code, out } = cases('read', name, '--set', 'PLL');
    expect(code).toBe(1);
    expect(out).toMatch(/line +2 +F +Solves another case +Says F, but the algorithm solves PLL T\./u);
    expect(out).toMatch(/0 of 1 line agree/u);
    expect(out).toMatch(/PLL: 0 of 21 cases covered/u);
    expect(out).toMatch(/Columns not used: speed/u);
  });

  it('counts the cases of a step', () => {
    const { code, out } = cases('count', '--entry', 'any', '--aspects', 'co,eo', '--json');
    expect(code).toBe(0);
    // Domain values: two classes of weight 288, five of 576, fifty-one of 1,152 among 62,208 states.
    expect(JSON.parse(out)).toEqual({
      ledger: ledgerOf('any', ['co', 'eo']),
      entry: 'any',
      aspects: ['co', 'eo'],
      cases: 58,
      states: 62_208,
      weights: [
        { weight: 288, cases: 2 },
        { weight: 576, cases: 5 },
        { weight: 1152, cases: 51 },
      ],
    });
    expect(cases('count', '--entry', 'corners', '--aspects', 'ep,eo').out).toMatch(/30 cases.*384/u);
  });

  it.each(EVERY_ENTRY)('counts from %s, with the whole page of the Ledger', (entry) => {
    const { code, out } = cases('count', '--entry', entry, '--aspects', ASPECTS.join(), '--json');
    expect(code).toBe(0);
    const told = JSON.parse(out);
    expect(told.ledger.cases.value).toBe(told.cases);
    expect(told.ledger.entryStates).toBe(told.states);
    // Common practice: 84 cases and the skip with edges oriented and corners permuted, 22 with all oriented.
    if (entry === 'cp+eo') expect(told.cases).toBe(85);
    if (entry === 'co+eo') expect(told.cases).toBe(22);
  });

  it.each([
    ['an unreadable file', ['read', 'quote.csv', '--set', 'PLL'], /^Line 3: .*never closed/u],
    ['a file that is not there', ['read', 'nowhere.csv', '--set', 'PLL'], /cannot be opened/u],
    ['an unknown set', ['read', 'quote.csv', '--set', 'F2L'], /no set "F2L".*OLL, PLL/u],
    ['no set', ['read', 'quote.csv'], /--set is missing/u],
    ['no file', ['read', '--set', 'PLL'], /FILE is missing/u],
    ['an unknown entry', ['count', '--entry', 'cross', '--aspects', 'co'], /no entry condition "cross"/u],
    ['an unknown aspect', ['count', '--entry', 'any', '--aspects', 'co,xo'], /no aspect "xo"/u],
    ['no aspects', ['count', '--entry', 'any'], /--aspects is missing/u],
    ['an unknown command', ['write'], /no command "write"/u],
    ['no command', [], /missing/u],
    ['a word too many', ['read', 'quote.csv', 'more', '--set', 'PLL'], /"more" is one word too many/u],
    ['an unknown option', ['count', '--colour', 'red'], /Unknown option/u],
  ])('ends with exit code 2 and a sentence for %s', (_, args, message) => {
    file('quote.csv', 'case,algorithm\nT,R\nF,"R U\n');
    const { code, out, err } = cases(...args);
    expect([code, out]).toEqual([2, '']);
    expect(err).toMatch(message);
    expect(err).not.toMatch(/\bat .*\.ts:/u);
  });

  it('ends as a process with the same codes: 0, 1 and 2', async () => {
    const broken = file('broken.csv', 'case,algorithm\nT,R\n');
    const seed = `${ROOT}/database/seed/case-sets/oll.csv`;
    const [good, bad, wrong] = await Promise.all([
      started('read', seed, '--set', 'OLL'),
      started('read', broken, '--set', 'PLL', '--json'),
      started('read', 'nowhere.csv', '--set', 'PLL'),
    ]);
    expect([good.code, bad.code, wrong.code]).toEqual([0, 1, 2]);
    expect(good.out).toMatch(/57 of 57 cases covered/u);
    expect(JSON.parse(bad.out).rows[0].finding).toBe('first-two-layers-broken');
    expect([wrong.out, good.err, bad.err]).toEqual(['', '', '']);
    expect(wrong.err).toMatch(/cannot be opened/u);
  }, 60_000);
});
