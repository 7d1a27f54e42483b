import { caseSet, rightAufsBefore } from '#shared/lastlayer/index.ts';
import type { Factory } from '#tests/support/factories.ts';

/** What a showing really is: what no page tells before the answer. */
export interface RealShowing {
  readonly setKey: string;
  readonly caseKey: string;
  readonly name: string;
  /** AUFs before with which the algorithm beside the question solves it. */
  readonly rightAufs: readonly number[];
}

/** Reads a showing as the owner and works out its right answers by the cube model. */
export async function realShowing(sql: Factory['sql'], showingId: string): Promise<RealShowing> {
  const [row] = await sql<{
    set_key: string;
    case_key: string;
    name: string;
    state: number;
    algorithm: string;
  }>(
    `select s.set_key, s.case_key, c.name, s.state, a.algorithm from showing s
     join edition_case c using (set_key, edition_number, case_key)
     join edition_algorithm a using (set_key, edition_number, case_key)
     where s.showing_id = $1 and a.rank = 1`,
    [showingId],
  );
  if (!row) throw new Error(`There is no showing ${showingId}.`);
  return {
    setKey: row.set_key,
    caseKey: row.case_key,
    name: row.name,
    rightAufs: rightAufsBefore(caseSet(row.set_key), row.algorithm, row.state),
  };
}
