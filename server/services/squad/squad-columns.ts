import type { CaseSet } from '#shared/lastlayer/index.ts';
import { deskText } from '#shared/text/desk.ts';
import type { EditionContent } from '../catalogue/read-edition.ts';
import { groupBy } from '../group-by.ts';
import type { ProgrammeEntry } from '../training/read-programme.ts';

/** A column of the squad's grid: a set, one group of a set, or all of the chosen set. */
export interface Column {
  /** As the page names it in addresses: a set's key, a group's name, `*` for all of the set. */
  readonly key: string;
  readonly name: string;
  readonly entry: ProgrammeEntry;
  /** null: every group of the set. */
  readonly group: string | null;
  /** Share of the solves reaching the set that deal one of its cases; null for whole sets. */
  readonly dealt: number | null;
}

const ALL = '*';

/** A column for each set of the programme. */
export function columnsOfSets(programme: readonly ProgrammeEntry[]): Column[] {
  return programme.map((entry) => ({
    key: entry.setKey,
    name: entry.setName,
    entry,
    group: null,
    dealt: null,
  }));
}

/** A column for each group of the set, in the order of its cases, and one for all of it at the end. */
export function columnsOfGroups(entry: ProgrammeEntry, set: CaseSet, content: EditionContent): Column[] {
  const all: Column = { key: ALL, name: deskText.squad.all, entry, group: null, dealt: null };
  const groups = groupBy(content.cases.values(), (c) => c.group);
  if (groups.size < 2) return [all];
  return [
    ...[...groups].map(([group, cases]) => ({
      key: group,
      name: group === '' ? deskText.squad.ungrouped : group,
      entry,
      group,
      dealt: cases.reduce((sum, { key }) => sum + (set.byKey(key)?.weight ?? 0), 0) / set.total,
    })),
    all,
  ];
}
