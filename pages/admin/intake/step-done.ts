import type { DraftLine } from '#shared/contracts/intake.ts';

/** What a step did to a line, told by how the line stands after it. */
export function stepDone({
  decision,
  original,
}: Pick<DraftLine, 'decision' | 'original'>): DraftLine['decision'] | 'edit' {
  return decision === 'none' && original ? 'edit' : decision;
}
