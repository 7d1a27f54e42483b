import { type ReactNode, useEffect, useState } from 'react';
import { useCall } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { ErrorState, LoadingState, ScreenHead } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { TodayView } from '#shared/contracts/today.ts';
import { memberText } from '#shared/text/member.ts';
import { todayText } from '#shared/text/today.ts';
import { AnswersState, RunOutScreen } from './answers-state.tsx';
import { LookingScreen, type Progress } from './looking-screen.tsx';
import { NamingScreen } from './naming-screen.tsx';
import { ReadyScreen } from './ready-screen.tsx';
import { SendingScreen } from './sending-screen.tsx';
import { noteFirstView } from './server-clock.ts';
import type { Sitting } from './sitting.ts';
import { OverScreen } from './summary-screen.tsx';
import { useOutbox, useOutboxState } from './use-outbox.ts';
import { type SittingActions, useSitting } from './use-sitting.ts';
import { VerdictScreen } from './verdict-screen.tsx';

/** Today: the review queue, one picture after the other. */
export function TodayPage() {
  const { data, dataUpdatedAt, isError, error, refetch } = useCall(endpoints.today, {});
  useEffect(() => {
    if (data) noteFirstView(data.serverNow, dataUpdatedAt);
  }, [data, dataUpdatedAt]);
  if (data) return <TodaySitting view={data} />;
  return (
    <Screen head={<ScreenHead title={todayText.title} />}>
      {isError ? (
        <ErrorState
          title={memberText.couldNotLoad}
          retryLabel={memberText.tryAgain}
          onRetry={() => void refetch()}
        >
          <p>{error.message}</p>
        </ErrorState>
      ) : (
        <LoadingState label={memberText.loading} />
      )}
    </Screen>
  );
}

function Screen({ head, children }: { head: ReactNode; children: ReactNode }) {
  return (
    <div className="mx-auto flex w-full max-w-xl flex-1 flex-col px-[18px]">
      {head}
      {children}
    </div>
  );
}

function TodaySitting({ view: latest }: { view: TodayView }) {
  const outbox = useOutbox();
  const answers = useOutboxState(outbox);
  const [sitting, actions] = useSitting(latest, outbox);
  const rest = useRestNote(sitting.phase.kind);
  const { view, phase } = sitting;
  const answered = view.answered + answers.unsentAnswers;
  const progress: Progress = { answered, planned: Math.max(view.planned, answered) };
  const note = rest ? <p className="text-[0.9375rem] text-ink-2">{todayText.rest}</p> : null;
  return (
    <Screen
      head={
        <ScreenHead title={todayText.title} subject={subjectOf(sitting)} aside={asideOf(sitting, progress)} />
      }
    >
      <AnswersState outbox={outbox} state={answers} />
      <PhaseScreen
        sitting={sitting}
        actions={actions}
        progress={progress}
        saved={answers.unsent === 0}
        note={note}
      />
      {phase.kind === 'run-out' && <RunOutScreen outbox={outbox} />}
    </Screen>
  );
}

interface PhaseProps {
  sitting: Sitting;
  actions: SittingActions;
  progress: Progress;
  saved: boolean;
  note: ReactNode;
}

function PhaseScreen({ sitting, actions, progress, saved, note }: PhaseProps) {
  const { club } = useSession();
  const { view, phase, held } = sitting;
  switch (phase.kind) {
    case 'ready':
      return (
        <ReadyScreen
          setNames={view.sets.map((set) => set.name)}
          progress={progress}
          secondsLeft={view.secondsLeft}
          club={club?.name ?? ''}
          note={note}
          onBegin={actions.begin}
        />
      );
    case 'looking':
      return (
        <LookingScreen
          key={phase.showing.id}
          picture={phase.showing.picture}
          holding={view.holding}
          progress={progress}
          passing={held ? todayText.passing(held.recognitionMs ?? 0, held.scored) : null}
          onGotIt={actions.gotIt}
          onNotRecognised={(ms) =>
            actions.answer({ named: 'unrecognised', aufBefore: null, recognitionMs: ms, namingMs: null })
          }
        />
      );
    case 'naming': {
      const set = view.sets.find(({ setKey }) => setKey === phase.showing.setKey);
      return (
        <NamingScreen
          key={phase.showing.id}
          keys={set?.grids[phase.showing.grid] ?? []}
          grid={phase.showing.grid}
          asksAuf={phase.showing.asksAuf}
          recognitionMs={phase.recognitionMs}
          onChoose={actions.answer}
        />
      );
    }
    case 'sending':
      return <SendingScreen progress={progress} />;
    case 'verdict':
      return (
        <VerdictScreen
          key={phase.judged.verdict.id}
          judged={phase.judged}
          holding={view.holding}
          today={view.date}
          misTapped={phase.misTapped}
          note={note}
          onMisTap={actions.misTap}
          onGoOn={actions.goOn}
        />
      );
    case 'over':
      return <OverScreen view={view} saved={saved} note={note} />;
    case 'run-out':
      return null;
  }
}

function subjectOf({ view, phase }: Sitting): string | undefined {
  if (phase.kind === 'verdict') return phase.judged.verdict.was.setName;
  if (phase.kind !== 'looking' && phase.kind !== 'naming' && phase.kind !== 'sending') return undefined;
  return view.sets.find(({ setKey }) => setKey === phase.showing.setKey)?.name;
}

function asideOf({ view, phase }: Sitting, { answered, planned }: Progress): string | undefined {
  switch (phase.kind) {
    case 'naming':
      return todayText.recognisedIn(phase.recognitionMs);
    case 'verdict':
      return todayText.times(phase.judged.verdict.recognitionMs, phase.judged.verdict.limitMs);
    case 'looking':
    case 'sending':
      return todayText.progress(answered, planned, view.secondsLeft);
    default:
      return undefined;
  }
}

const REST_AFTER_MS = 15 * 60_000;

/** True once the sitting has lasted a quarter of an hour: asked between pictures, never over one. */
function useRestNote(phase: Sitting['phase']['kind']): boolean {
  const [beganAt, setBeganAt] = useState<number | null>(null);
  const [due, setDue] = useState(false);
  useEffect(() => {
    if (phase === 'looking') setBeganAt((known) => known ?? Date.now());
    else setDue(beganAt !== null && Date.now() - beganAt >= REST_AFTER_MS);
  }, [phase, beganAt]);
  return due;
}
