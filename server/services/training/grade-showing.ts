import type { tables } from '#database/client.ts';
import type { AnswerInput } from '#shared/contracts/today.ts';
import { type CaseSet, lostBy, rightAufsBefore } from '#shared/lastlayer/index.ts';
import { boundTimes, gradeAnswer, localDay, NAMING_LIMIT_MS } from '#shared/memory/index.ts';
import { Problem } from '../../http/problem.ts';
import type { EditionContent } from '../catalogue/read-edition.ts';
import { bodyHash } from './body-hash.ts';
import { gridOf, gridsOf, OTHER_CHOICES, SOLVED } from './grid.ts';
import type { ShowingRow, TrainingDay } from './training-day.ts';

type NewReview = typeof tables.review.$inferInsert;

/** The algorithm a showing's AUF is asked for: the edition's first for the case. */
export function algorithmShown(content: EditionContent, caseKey: string): string {
  return content.cases.get(caseKey)?.algorithms[0]?.algorithm ?? '';
}

/** What is wrong with a raw choice, or null: it must be one of the keys that were offered. */
export function wrongChoice(
  showing: ShowingRow,
  set: CaseSet,
  content: EditionContent,
  answer: AnswerInput,
): string | null {
  const c = set.byKey(showing.caseKey);
  const offered = c ? (gridsOf(set, content)[gridOf(c)] ?? []) : [];
  const isWord = (OTHER_CHOICES as readonly string[]).includes(answer.named);
  if (!isWord && !offered.some(({ key }) => key === answer.named))
    return 'That name was not offered with this showing.';
  const namesCase = !isWord && answer.named !== SOLVED;
  if (showing.asksAuf && namesCase && answer.aufBefore === null) return 'The AUF before is missing.';
  if (!isWord && answer.recognitionMs === null) return 'The recognition time is missing.';
  return null;
}

/**
 * Grades a raw choice against its showing: the row of the log, complete.
 * @throws Problem cannot-take when its times cannot be.
 */
export function gradeShowing(
  day: TrainingDay,
  showing: ShowingRow,
  { set, content }: { set: CaseSet; content: EditionContent },
  answer: AnswerInput,
  receivedAt: number,
): NewReview {
  const issuedAt = showing.issuedAt.getTime();
  const times = boundTimes({
    issuedAt,
    receivedAt,
    claimedAnsweredAt: answer.answeredAt,
    recognitionMs: answer.recognitionMs,
    namingMs: answer.namingMs,
  });
  if (!times.ok) throw new Problem('cannot-take', 'The answer took longer than its showing was out.');
  const algorithm = algorithmShown(content, showing.caseKey);
  const grade = gradeAnswer(
    {
      named: answer.named,
      aufBefore: answer.aufBefore,
      recognitionMs: times.recognitionMs,
      namingMs: times.namingMs,
    },
    {
      caseKey: showing.caseKey,
      rightAufs: rightAufsBefore(set, algorithm, showing.state),
      asksAuf: showing.asksAuf,
      limitMs: showing.limitMs,
      namingLimitMs: NAMING_LIMIT_MS,
      lengthened: false,
    },
  );
  const named = set.byKey(answer.named);
  return {
    clubId: showing.clubId,
    memberId: showing.memberId,
    reviewId: answer.id,
    showingId: showing.showingId,
    setKey: showing.setKey,
    caseKey: showing.caseKey,
    editionNumber: showing.editionNumber,
    state: showing.state,
    colouring: showing.colouring,
    keysOffered: showing.keysOffered,
    limitMs: showing.limitMs,
    asksAuf: showing.asksAuf,
    algorithm: showing.asksAuf ? algorithm : null,
    named: answer.named,
    aufBefore: answer.aufBefore,
    recognitionMs: times.recognitionMs,
    namingMs: times.namingMs,
    outcome: grade.outcome,
    caseRight: grade.caseRight,
    aufRight: grade.aufRight,
    scored: grade.scored,
    unscoredReason: grade.unscoredReason,
    onBoards: grade.onBoards,
    lostBy: lossOf(grade, named ? lostBy(set, showing.state, named) : null),
    localDay: localDay(times.answeredAt, day.actor.timeZone, day.actor.rolloverHour),
    issuedAt: showing.issuedAt,
    answeredAt: new Date(times.answeredAt),
    receivedAt: new Date(receivedAt),
    bodyHash: bodyHash(answer),
  };
}

/** What a showing was lost by: the aspect that tells the named case apart, the AUF, the time; null when held. */
function lossOf(
  grade: { outcome: string; caseRight: boolean; aufRight: boolean | null },
  aspect: string | null,
): string | null {
  if (grade.outcome === 'held' || grade.outcome === 'left') return null;
  if (grade.outcome === 'late') return 'late';
  if (grade.caseRight && grade.aufRight === false) return 'AUF before';
  return aspect ?? 'not recognised';
}
