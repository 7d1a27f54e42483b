import type { Transaction } from '#database/client.ts';
import type { Verdict } from '#shared/contracts/today.ts';
import { differsAt, nearestView, rightAufsBefore, seenThrough } from '#shared/lastlayer/index.ts';
import { stickersOf } from '#shared/lastlayer/pictures/index.ts';
import { caseStateName, dueDay, wantedRecall } from '#shared/memory/index.ts';
import { findingsText } from '#shared/text/findings.ts';
import { todayWords } from '#shared/text/today-words.ts';
import { withAliases } from '../aliases/with-aliases.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import { isoDate } from '../standing/local-date.ts';
import { betaOf, cardsOf, type DayCard, tellingDay } from './cards.ts';
import type { ReviewRow } from './day-counts.ts';
import { algorithmShown } from './grade-showing.ts';
import type { TrainingDay } from './training-day.ts';

interface Judged {
  readonly row: ReviewRow;
  readonly status: Verdict['status'];
  /** The case comes back within this sitting. */
  readonly returns: boolean;
}

/** Verdicts as the member sees them: the two pictures, where they differ, and when the case is back. */
export async function presentVerdicts(
  tx: Transaction,
  day: TrainingDay,
  judged: readonly Judged[],
): Promise<Verdict[]> {
  const cards = new Map(cardsOf(day).map((card) => [card.key, card]));
  const verdicts: Verdict[] = [];
  for (const one of judged)
    verdicts.push(await presentVerdict(tx, day, one, cards.get(one.row.caseKey) ?? null));
  return verdicts;
}

async function presentVerdict(
  tx: Transaction,
  day: TrainingDay,
  { row, status, returns }: Judged,
  card: DayCard | null,
): Promise<Verdict> {
  const set = await loadCaseSet(tx, row.setKey);
  const content = withAliases(await readEditionContent(tx, row.setKey, row.editionNumber), day.aliases);
  const algorithm = algorithmShown(content, row.caseKey);
  const named = row.caseRight ? undefined : row.named === 'solved' ? set.skip : set.byKey(row.named);
  const view = named ? nearestView(set, row.state, named, day.member.holding) : null;
  const seen = seenThrough(set.definition.entry, set.definition.toldApart);
  const difference = view === null ? null : differsAt(row.state, view, day.member.holding, seen);
  const name = content.cases.get(row.caseKey)?.name ?? '';
  const namedName = named?.skip
    ? todayWords.solved
    : (content.cases.get(named?.key ?? '')?.name ?? named?.name ?? '');
  const memory = day.memory.get(row.caseKey) ?? null;
  const wanted = card?.wanted ?? wantedRecall(1, 1, betaOf(day));
  return {
    id: row.reviewId,
    status,
    outcome: row.outcome,
    caseRight: row.caseRight,
    aufRight: row.aufRight,
    scored: row.scored,
    unscoredReason: row.unscoredReason,
    recognitionMs: row.recognitionMs,
    limitMs: row.limitMs,
    was: {
      key: row.caseKey,
      name,
      setName: set.definition.name,
      picture: { stickers: stickersOf(row.state), colouring: row.colouring },
      algorithm,
      rightAufs: [...rightAufsBefore(set, algorithm, row.state)],
    },
    named:
      named && view !== null
        ? {
            key: named.key,
            name: namedName,
            picture: { stickers: stickersOf(view), colouring: row.colouring },
          }
        : null,
    differsAt: difference ? findingsText.differs(difference, name, namedName) : null,
    lostBy: row.lostBy,
    back: { thisSitting: returns, date: memory ? isoDate(dueDay(memory, wanted)) : null },
    state: caseStateName(memory, memory ? tellingDay(day.day, memory) : day.day, card?.slipsBelow ?? wanted),
  };
}
