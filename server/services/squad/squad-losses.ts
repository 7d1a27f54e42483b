import { eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { SquadView } from '#shared/contracts/desk.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import type { CaseMemory } from '#shared/memory/index.ts';
import { withAliases } from '../aliases/with-aliases.ts';
import { casePicture } from '../catalogue/case-picture.ts';
import { loadCaseSets } from '../catalogue/load-set.ts';
import { readAliases } from '../catalogue/read-aliases.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import { memoryOfRow } from '../training/member-day.ts';
import { type ProgrammeEntry, programmeOfMember } from '../training/read-programme.ts';
import { explainLosses } from './explain-losses.ts';
import { type Answering, costliest, type Loss, lossesOf } from './lost-cases.ts';
import type { GroupSums } from './squad-figures.ts';
import type { SquadMember } from './squad-members.ts';

export interface LossesRequest {
  readonly clubId: string;
  readonly members: readonly SquadMember[];
  readonly entries: readonly ProgrammeEntry[];
  /** Newest rollup rows: the calibration and the day each member's figures stand under. */
  readonly newest: readonly GroupSums[];
  /** The captain's training day: for members without a rollup yet. */
  readonly today: number;
  /** First day of the answers that explain a loss. */
  readonly fromDay: number;
  readonly count: number;
}

/** The cases of these sets that cost the squad most, each with what is behind it. */
export async function squadLosses(tx: Transaction, request: LossesRequest): Promise<SquadView['lost']> {
  const { clubId, entries, count } = request;
  const sets = await loadCaseSets(
    tx,
    entries.map((entry) => entry.setKey),
  );
  const memories = await readMemories(tx, clubId, [...sets.values()]);
  const aliases = await readAliases(tx, { clubId });
  const all: Loss[] = [];
  for (const entry of entries) {
    const set = sets.get(entry.setKey);
    if (!set) continue;
    const content = withAliases(await readEditionContent(tx, entry.setKey, entry.edition), aliases);
    all.push(...lossesOf(set, content, squadOf(request, entry, memories)));
  }
  const worst = costliest(all, count);
  const mostly = await explainLosses(tx, request, worst);
  return worst.map(({ set, content, case: c, share }) => {
    const known = content.cases.get(c.key);
    return {
      setKey: content.setKey,
      setName: content.setName,
      key: c.key,
      name: known?.name ?? c.name,
      tradeName: known?.tradeName ?? null,
      picture: casePicture(set, c, known?.algorithms[0]?.algorithm),
      share,
      mostly: mostly.get(c.key) ?? '',
    };
  });
}

function squadOf(
  { members, newest, today }: LossesRequest,
  entry: ProgrammeEntry,
  memories: ReadonlyMap<string, ReadonlyMap<string, CaseMemory>>,
): Answering[] {
  return members
    .filter(({ memberId }) => programmeOfMember([entry], memberId).length > 0)
    .map(({ memberId, nickname }) => {
      const row = newest.find((one) => one.memberId === memberId && one.setKey === entry.setKey);
      return {
        nickname,
        memory: memories.get(memberId) ?? new Map<string, CaseMemory>(),
        shift: row?.shift ?? 0,
        day: row?.day ?? today,
      };
    });
}

/** What the club's members remember of these sets' cases, whichever set they answered them through. */
async function readMemories(
  tx: Transaction,
  clubId: string,
  sets: readonly CaseSet[],
): Promise<Map<string, Map<string, CaseMemory>>> {
  const { caseState } = tables;
  const found = new Map<string, Map<string, CaseMemory>>();
  if (sets.length === 0) return found;
  const rows = await tx.select().from(caseState).where(eq(caseState.clubId, clubId));
  for (const row of rows) {
    if (!sets.some((set) => set.byKey(row.caseKey))) continue;
    const own = found.get(row.memberId) ?? new Map<string, CaseMemory>();
    own.set(row.caseKey, memoryOfRow(row));
    found.set(row.memberId, own);
  }
  return found;
}
