import type { Transaction } from '#database/client.ts';
import type { DraftLine, DraftView } from '#shared/contracts/intake.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import { intakeText } from '#shared/text/intake.ts';
import { casePicture } from '../catalogue/case-picture.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { inNameOrder, newestEditions, readEditionContent } from '../catalogue/read-edition.ts';
import { type JudgedLine, judgeLines, wordsOf } from './judge-lines.ts';
import { mergeEdition } from './merge-edition.ts';
import type { Draft } from './read-draft.ts';

/** A draft as its page shows it: findings read anew, and what publishing would do to the newest edition. */
export async function presentDraft(tx: Transaction, draft: Draft): Promise<DraftView> {
  const set = await loadCaseSet(tx, draft.setKey);
  const newestEdition = (await newestEditions(tx)).get(draft.setKey) ?? null;
  const newest = newestEdition === null ? null : await readEditionContent(tx, draft.setKey, newestEdition);
  const lines = judgeLines(set, draft.kept);
  const covered = new Set(lines.flatMap(({ goesTo }) => (goesTo ? [goesTo.key] : [])));
  const { kept: _, version, unknownColumns, ...summary } = draft;
  return {
    draft: summary,
    version,
    lines: lines.map((line) => presentLine(set, line)),
    unknownColumns,
    covered: covered.size,
    of: set.cases.length,
    missing: set.cases
      .filter(({ key }) => !covered.has(key))
      .map(({ name }) => name)
      .sort(inNameOrder),
    newestEdition,
    cannot: lines.filter(({ standing }) => standing === 'cannot').length,
    toDecide: lines.filter(({ standing }) => standing === 'decide').length,
    effect: mergeEdition(set, lines, newest).effect,
  };
}

function presentLine(set: CaseSet, { kept, read, solves, decision, standing }: JudgedLine): DraftLine {
  const { caseName, algorithm } = wordsOf(kept);
  const edited = kept.editedCaseName !== null || kept.editedAlgorithm !== null;
  const facts = {
    finding: read.finding,
    setName: set.definition.name,
    caseName,
    algorithm,
    known: set.byName(caseName) !== undefined,
    solves: solves?.name ?? null,
    angles: solves?.angles ?? null,
    column: read.column ?? null,
    token: read.token ?? null,
    pieces: read.pieces ?? [],
    sameAs: read.sameAs ?? null,
  };
  return {
    line: kept.line,
    caseName,
    algorithm,
    group: kept.group,
    note: kept.note,
    original: edited ? { caseName: kept.caseName, algorithm: kept.algorithm } : null,
    finding: read.finding,
    column: facts.column,
    token: facts.token,
    says: intakeText.says(facts),
    hint: intakeText.hint(facts),
    solves: facts.solves,
    prior: solves ? { weight: solves.weight, total: set.total } : null,
    angles: facts.angles,
    picture: solves ? casePicture(set, solves, read.normalised ?? undefined) : null,
    decision,
    standing,
  };
}
