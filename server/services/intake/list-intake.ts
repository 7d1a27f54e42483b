import { and, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { IntakeView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { inTradeOrder } from '../catalogue/list-catalogue.ts';
import { newestEditions } from '../catalogue/read-edition.ts';
import { asAdministrator, type Ctx } from '../context.ts';
import { readDraftSummaries } from './read-draft.ts';

/** More than anyone looks through; older files stay in the database. */
const MOST_DRAFTS = 500;

/** The sets a file can be for (those with editions of their own), and the files brought in so far. */
export async function listIntake(ctx: Ctx): Promise<IntakeView> {
  return asAdministrator(ctx, (tx) => intakeView(tx));
}

/** What the intake page shows, in a transaction opened as administrator. */
export async function intakeView(tx: Transaction): Promise<IntakeView> {
  const { caseSet, setCase } = tables;
  const sets = await tx
    .select({
      setKey: caseSet.setKey,
      name: caseSet.name,
      clubId: caseSet.clubId,
      cases: sql<number>`count(*) filter (where not ${setCase.isSkip})::int`,
    })
    .from(caseSet)
    .innerJoin(setCase, eq(setCase.setKey, caseSet.setKey))
    .where(and(isNull(caseSet.parentKey), isNull(caseSet.retiredAt)))
    .groupBy(caseSet.setKey);
  const newest = await newestEditions(tx);
  return {
    sets: sets
      .sort((one, other) => inTradeOrder(one.setKey, other.setKey))
      .map(({ clubId, name, ...set }) => ({
        ...set,
        name: clubId === null ? name : intakeText.ofAClub(name, set.setKey),
        newestEdition: newest.get(set.setKey) ?? null,
      })),
    drafts: await readDraftSummaries(tx, MOST_DRAFTS),
  };
}
