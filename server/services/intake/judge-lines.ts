import type { DraftLine } from '#shared/contracts/intake.ts';
import { type CaseOfSet, type CaseSet, type ReadLine, readCaseLines } from '#shared/lastlayer/index.ts';
import { expandAlgorithm } from './expand-algorithm.ts';

/** A line as it is kept: the file's words, what was typed over them, what was decided. */
export interface KeptLine {
  readonly line: number;
  readonly caseName: string;
  readonly algorithm: string;
  readonly group: string;
  readonly note: string;
  readonly decision: 'none' | 'take' | 'drop';
  readonly editedCaseName: string | null;
  readonly editedAlgorithm: string | null;
}

/** A line, what the cube says of it, and where that leaves it. */
export interface JudgedLine {
  readonly kept: KeptLine;
  readonly read: ReadLine;
  /** The case the algorithm really solves, the skip included. */
  readonly solves: CaseOfSet | null;
  /** The decision as far as it has a meaning for the finding. */
  readonly decision: KeptLine['decision'];
  readonly standing: DraftLine['standing'];
  /** The case the line goes to when it is published; null unless its standing is fine. */
  readonly goesTo: CaseOfSet | null;
}

/** The words in force: the edit's where there is one. */
export const wordsOf = (kept: KeptLine): { caseName: string; algorithm: string } => ({
  caseName: kept.editedCaseName ?? kept.caseName,
  algorithm: kept.editedAlgorithm ?? kept.algorithm,
});

/**
 * Findings and standings of a draft's lines, from nothing but the lines: reading them again always gives the
 * same. Dropped lines are read after the others, so that no line counts as the duplicate of a dropped one.
 */
export function judgeLines(set: CaseSet, lines: readonly KeptLine[]): JudgedLine[] {
  const ordered = [
    ...lines.filter(({ decision }) => decision !== 'drop'),
    ...lines.filter(({ decision }) => decision === 'drop'),
  ];
  const { rows } = readCaseLines(
    set,
    ordered.map((kept) => {
      const { caseName, algorithm } = wordsOf(kept);
      return { line: kept.line, case: caseName, algorithm, group: kept.group, note: kept.note };
    }),
    expandAlgorithm,
  );
  return ordered
    .map((kept, at) => judge(set, kept, rows[at]!))
    .sort((one, other) => one.kept.line - other.kept.line);
}

function judge(set: CaseSet, kept: KeptLine, read: ReadLine): JudgedLine {
  const solves = read.solves === null ? null : (set.byName(read.solves) ?? null);
  const line = { kept, read, solves };
  if (kept.decision === 'drop') return { ...line, decision: 'drop', standing: 'out', goesTo: null };
  if (read.finding === 'agrees') {
    // Nobody needs an algorithm for the skip.
    return solves && !solves.skip
      ? { ...line, decision: 'none', standing: 'fine', goesTo: solves }
      : { ...line, decision: 'none', standing: 'cannot', goesTo: null };
  }
  if (canBeTaken(line)) {
    return kept.decision === 'take'
      ? { ...line, decision: 'take', standing: 'fine', goesTo: solves }
      : { ...line, decision: 'none', standing: 'decide', goesTo: null };
  }
  const standing = read.finding === 'duplicate' ? 'decide' : 'cannot';
  return { ...line, decision: 'none', standing, goesTo: null };
}

/** Whether the line may go in as the case its algorithm solves instead of the one it names. */
export function canBeTaken({ read, solves }: Pick<JudgedLine, 'read' | 'solves'>): boolean {
  return read.finding === 'solves-other' && solves !== null && !solves.skip;
}

/** How many lines stand in the way of publishing. */
export function blocking(lines: readonly JudgedLine[]): number {
  return lines.filter(({ standing }) => standing === 'cannot' || standing === 'decide').length;
}
