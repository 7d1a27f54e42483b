import { type ReactNode, useEffect, useRef, useState } from 'react';
import {
  AlgorithmText,
  Button,
  type DefinitionRow,
  Definitions,
  SeatView,
  Verdict as VerdictFrame,
} from '#renderer/ui/index.ts';
import type { AnswerInput, Verdict } from '#shared/contracts/today.ts';
import { aufText } from '#shared/text/auf.ts';
import { todayText } from '#shared/text/today.ts';
import { sayDate } from '../say-date.ts';
import { serverTime } from './server-clock.ts';
import type { Judged } from './sitting.ts';

export interface VerdictScreenProps {
  readonly judged: Judged;
  readonly holding: 'right' | 'left';
  /** The local date of the sitting, ISO. */
  readonly today: string;
  readonly misTapped: boolean;
  readonly note: ReactNode;
  readonly onMisTap: () => void;
  readonly onGoOn: () => void;
}

const MIS_TAP_MS = 10_000;

/** A showing that was late or missed: what it was, what it was taken for, and where they differ. */
export function VerdictScreen(props: VerdictScreenProps) {
  const { judged, holding, today, misTapped, note, onMisTap, onGoOn } = props;
  const { verdict, answer } = judged;
  const canMisTap = useStillWithin(answer, MIS_TAP_MS);
  const goOn = useRef<HTMLDivElement>(null);
  useEffect(() => {
    goOn.current?.querySelector('button')?.focus({ preventScroll: true });
  }, []);
  const picture = (of: Verdict['was']['picture']) => (
    <SeatView stickers={of.stickers} colouring={of.colouring} holding={holding} />
  );
  return (
    <div className="flex flex-1 flex-col gap-4 py-4">
      <p role="status" className="sr-only">
        {statusOf(verdict)}
      </p>
      <VerdictFrame
        tone="ink"
        word={todayText.itWas}
        name={verdict.was.name}
        picture={picture(verdict.was.picture)}
      >
        <WordOfOutcome verdict={verdict} answer={answer} />
      </VerdictFrame>
      {verdict.named?.picture && (
        <VerdictFrame
          tone="rose"
          word={todayText.named}
          name={verdict.named.name}
          struck
          picture={picture(verdict.named.picture)}
        />
      )}
      <Definitions rows={rowsOf(verdict, answer, today)} />
      {misTapped && (
        <p role="status" className="text-[0.9375rem] text-ink-2">
          {todayText.misTapDone}
        </p>
      )}
      {note}
      <div className="sticky bottom-16 mt-auto flex gap-2.5 bg-paper py-2 lg:bottom-0">
        <Button
          kind="outlined"
          size="wide"
          className="flex-1 basis-1/3 font-normal"
          blocked={!canMisTap || misTapped}
          onClick={onMisTap}
        >
          {todayText.misTap}
        </Button>
        <div ref={goOn} className="flex flex-1 basis-2/3">
          <Button size="wide" onClick={onGoOn}>
            {todayText.goOn}
          </Button>
        </div>
      </div>
    </div>
  );
}

/** Under the name, where there is no second picture to say it. */
function WordOfOutcome({ verdict, answer }: { verdict: Verdict; answer: AnswerInput | null }) {
  const word = verdict.outcome === 'late' ? todayText.late : missWord(verdict, answer);
  return word === null ? null : <span className="mt-1 block text-[0.9375rem]">{word}</span>;
}

function missWord(verdict: Verdict, answer: AnswerInput | null): string | null {
  if (verdict.caseRight) return todayText.rightCase;
  if (answer?.named === 'unrecognised') return todayText.notRecognisedWord;
  return answer?.named === 'lost' ? todayText.lostWord : null;
}

function statusOf(verdict: Verdict): string {
  const { name } = verdict.was;
  if (verdict.outcome === 'late') return todayText.verdictStatus.late(name);
  if (verdict.caseRight) return todayText.verdictStatus.auf(name);
  return todayText.verdictStatus.missed(name, verdict.named?.name ?? null);
}

function rowsOf(verdict: Verdict, answer: AnswerInput | null, today: string): DefinitionRow[] {
  const { rows } = todayText;
  const { was, differsAt, lostBy, back } = verdict;
  const all: (DefinitionRow | null)[] = [
    differsAt === null ? null : { term: rows.differsAt, value: differsAt },
    was.rightAufs.length === 0
      ? null
      : { term: rows.aufBefore, value: <AufValue verdict={verdict} answer={answer} /> },
    was.algorithm === ''
      ? null
      : { term: rows.algorithm, value: <AlgorithmText text={was.algorithm} className="text-lg" /> },
    lostBy === null ? null : { term: rows.lostBy, value: todayText.lostBy(lostBy, answer?.named ?? null) },
    verdict.scored ? null : { term: rows.score, value: todayText.notScored(verdict.unscoredReason) },
    {
      term: rows.back,
      value: todayText.back(back.thisSitting, back.date === null ? null : sayDate(back.date, today)),
    },
  ];
  return all.filter((row) => row !== null);
}

function AufValue({ verdict, answer }: { verdict: Verdict; answer: AnswerInput | null }) {
  const right = aufText.anyOf(verdict.was.rightAufs);
  if (verdict.aufRight !== false || answer?.aufBefore == null) return <>{right}</>;
  return (
    <>
      {todayText.aufNot(right)}
      <s className="font-bold text-rose decoration-2">{aufText.name(answer.aufBefore)}</s>
    </>
  );
}

/** Whether the answer is younger than this; false for one this device knows nothing of. */
function useStillWithin(answer: AnswerInput | null, ms: number): boolean {
  const left = answer ? answer.answeredAt + ms - serverTime() : 0;
  const [within, setWithin] = useState(left > 0);
  useEffect(() => {
    if (!within) return;
    const timer = setTimeout(() => setWithin(false), left);
    return () => clearTimeout(timer);
  });
  return within;
}
