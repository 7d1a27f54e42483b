import type { DraftView } from '#shared/contracts/intake.ts';
import { type CaseOfSet, type CaseSet, cancelledKey, parseAlgorithm } from '#shared/lastlayer/index.ts';
import type { EditionAlgorithm, EditionCase, EditionContent } from '../catalogue/read-edition.ts';
import { expandAlgorithm } from './expand-algorithm.ts';
import type { JudgedLine } from './judge-lines.ts';

export interface MergedEdition {
  /** In canonical order. */
  readonly cases: readonly EditionCase[];
  readonly effect: DraftView['effect'];
}

/** Equal for two texts that are the same algorithm after cancelling and normalising. */
const identity = (algorithm: string): string =>
  cancelledKey(parseAlgorithm(algorithm, expandAlgorithm).moves);

/**
 * The edition that a draft's lines and the newest edition make together. Of a case in the file, the lines'
 * algorithms come first in the order of the file, then the others the newest edition has; a case that is not
 * in the file stays as it is. An algorithm that is there already keeps its note unless the line brings one.
 */
export function mergeEdition(
  set: CaseSet,
  lines: readonly JudgedLine[],
  newest: EditionContent | null,
): MergedEdition {
  const byCase = new Map<string, JudgedLine[]>();
  for (const line of lines) {
    if (!line.goesTo) continue;
    const of = byCase.get(line.goesTo.key) ?? [];
    of.push(line);
    byCase.set(line.goesTo.key, of);
  }
  const effect = { newCases: 0, newAlgorithms: 0, keptCases: 0, alreadyThere: 0 };
  const cases: EditionCase[] = [];
  for (const c of set.cases) {
    const old = newest?.cases.get(c.key);
    const brought = byCase.get(c.key);
    if (brought) {
      const merged = mergeCase(c, brought, old);
      cases.push(merged.case);
      if (!old) effect.newCases += 1;
      effect.newAlgorithms += brought.length - merged.alreadyThere;
      effect.alreadyThere += merged.alreadyThere;
    } else if (old) {
      cases.push(old);
      effect.keptCases += 1;
    }
  }
  return { cases, effect };
}

function mergeCase(
  c: CaseOfSet,
  lines: readonly JudgedLine[],
  old: EditionCase | undefined,
): { case: EditionCase; alreadyThere: number } {
  const left = new Map((old?.algorithms ?? []).map((known) => [identity(known.algorithm), known]));
  const first: EditionAlgorithm[] = lines.map(({ kept, read }) => {
    const algorithm = read.normalised ?? read.algorithm;
    const id = identity(algorithm);
    const known = left.get(id);
    left.delete(id);
    return { algorithm, note: kept.note || (known?.note ?? '') };
  });
  const alreadyThere = (old?.algorithms.length ?? 0) - left.size;
  return {
    case: {
      key: c.key,
      name: old?.name ?? c.name,
      group: groupFrom(lines) || (old?.group ?? c.group),
      algorithms: [...first, ...left.values()],
    },
    alreadyThere,
  };
}

/** The first group a line names for the case itself; a line taken as another case says nothing of that one. */
function groupFrom(lines: readonly JudgedLine[]): string {
  return lines.find(({ kept, decision }) => decision !== 'take' && kept.group !== '')?.kept.group ?? '';
}
