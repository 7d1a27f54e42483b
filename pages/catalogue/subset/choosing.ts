import type { CaseChoices } from '#shared/contracts/case-sets.ts';

export type CaseChoice = CaseChoices['cases'][number];

/** What cases can be grouped by, as it stands in the address. */
export const GROUPINGS = ['group', 'corners', 'edges', 'swap'] as const;
export type Grouping = (typeof GROUPINGS)[number];

const inOrder = new Intl.Collator('en', { numeric: true });

/** The groupings that tell this set's cases apart at all; all of one group is no grouping. */
export function groupingsOf(cases: readonly CaseChoice[]): Grouping[] {
  return GROUPINGS.filter((by) => new Set(cases.map((c) => c[by] ?? '')).size > 1);
}

export interface CaseGroup {
  /** Empty for cases without a group. */
  readonly name: string;
  readonly cases: readonly CaseChoice[];
}

/** The cases by group, in the order of the groups' names, those without a group last; within each by name. */
export function groupCases(cases: readonly CaseChoice[], by: Grouping | null): CaseGroup[] {
  const groups = new Map<string, CaseChoice[]>();
  for (const c of cases) {
    const name = by === null ? '' : (c[by] ?? '');
    const group = groups.get(name);
    if (group) group.push(c);
    else groups.set(name, [c]);
  }
  return [...groups]
    .map(([name, of]) => ({ name, cases: of.sort((one, other) => inOrder.compare(one.name, other.name)) }))
    .sort(
      (one, other) =>
        Number(one.name === '') - Number(other.name === '') || inOrder.compare(one.name, other.name),
    );
}

/** The chosen cases with these added, or taken out. */
export function withCases(
  chosen: ReadonlySet<string>,
  cases: readonly CaseChoice[],
  take: boolean,
): ReadonlySet<string> {
  const next = new Set(chosen);
  for (const { key } of cases) {
    if (take) next.add(key);
    else next.delete(key);
  }
  return next;
}

/** Share of the solves reaching the step that deal one of the chosen cases. */
export function dealtShare({ cases, total }: CaseChoices, chosen: ReadonlySet<string>): number {
  return cases.reduce((sum, { key, weight }) => (chosen.has(key) ? sum + weight : sum), 0) / total;
}
