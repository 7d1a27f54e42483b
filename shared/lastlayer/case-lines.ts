/** Findings: what the cube says about each line of a case file. */
import type { CaseSet } from './case-set.ts';
import { type Expander, parseMoves } from './notation.ts';
import { cancelledKey } from './same-algorithm.ts';
import { type Solves, solvesCase } from './solving.ts';

/**
 * What is found on a line; the first that applies, in this order:
 * - `missing-field`: no case name or no algorithm;
 * - `not-a-move`: the algorithm cannot be read, `column` says where;
 * - `duplicate`: the same algorithm as an earlier line after normalising and cancelling, whatever either
 *   line calls it: taking the line away is the remedy for all that may be wrong with it besides;
 * - `first-two-layers-broken`;
 * - `not-in-set`: a last-layer algorithm, but it undoes what is done before this step;
 * - `solves-other`: it solves a case of the set, or the skip, that is not the one named; also where the name
 *   is unknown in the set, since the case it solves is the most useful thing to say;
 * - `agrees`.
 */
export type Finding =
  | 'agrees'
  | 'solves-other'
  | 'first-two-layers-broken'
  | 'not-a-move'
  | 'duplicate'
  | 'not-in-set'
  | 'missing-field';

export interface CaseLine {
  /** Physical line of the file, from 1 with the header. */
  readonly line: number;
  readonly case: string;
  readonly algorithm: string;
  readonly group?: string;
  readonly note?: string;
}

export interface ReadLine extends CaseLine {
  readonly finding: Finding;
  /** Plain moves in normalised text; null if the algorithm cannot be read. */
  readonly normalised: string | null;
  /** Name of the case the algorithm really solves, `skip`, or null. */
  readonly solves: string | null;
  /** With `not-a-move`: the first wrong character of the algorithm, from 1, and the word it stands in. */
  readonly column?: number;
  readonly token?: string;
  /** With `first-two-layers-broken`: names of the pieces left displaced. */
  readonly pieces?: readonly string[];
  /** With `duplicate`: the line that has the same algorithm. */
  readonly sameAs?: number;
}

export interface ReadLines {
  readonly rows: readonly ReadLine[];
  /** Cases, the skip apart, for which a line agrees. */
  readonly covered: number;
  /** Cases of the set, the skip apart. */
  readonly of: number;
  /** Names of the cases not covered, 2 before 10. */
  readonly missing: readonly string[];
}

const nameSolved = (solves: Solves): string | null => ('case' in solves ? solves.case.name : null);

function readLine(set: CaseSet, line: CaseLine, seen: Map<string, number>, expand?: Expander): ReadLine {
  const named = line.case.trim();
  const missing = named === '' || line.algorithm.trim() === '';
  if (line.algorithm.trim() === '')
    return { ...line, finding: 'missing-field', normalised: null, solves: null };
  const solves = solvesCase(set, line.algorithm, expand);
  if (solves.kind === 'not-a-move') {
    const unread = { ...line, normalised: null, solves: null };
    if (missing) return { ...unread, finding: 'missing-field' };
    return { ...unread, finding: 'not-a-move', column: solves.column, token: solves.token };
  }
  const { normalised } = solves;
  const read = { ...line, normalised, solves: nameSolved(solves) };
  const key = cancelledKey(parseMoves(normalised));
  const sameAs = seen.get(key);
  if (sameAs === undefined) seen.set(key, line.line);
  if (missing) return { ...read, finding: 'missing-field' };
  if (sameAs !== undefined) return { ...read, finding: 'duplicate', sameAs };
  if (solves.kind === 'first-two-layers-broken')
    return { ...read, finding: solves.kind, pieces: solves.pieces };
  if (solves.kind === 'not-in-set') return { ...read, finding: 'not-in-set' };
  return { ...read, finding: set.byName(named) === solves.case ? 'agrees' : 'solves-other' };
}

/** Reads every line on the cube. Lines keep their order; the first of equal algorithms is no duplicate. */
export function readCaseLines(set: CaseSet, lines: readonly CaseLine[], expand?: Expander): ReadLines {
  const seen = new Map<string, number>();
  const rows = lines.map((line) => readLine(set, line, seen, expand));
  const agreed = new Set(rows.flatMap((row) => (row.finding === 'agrees' ? [row.solves] : [])));
  const missing = set.cases
    .map(({ name }) => name)
    .filter((name) => !agreed.has(name))
    .sort((a, b) => a.localeCompare(b, 'en', { numeric: true }));
  return { rows, covered: set.cases.length - missing.length, of: set.cases.length, missing };
}
