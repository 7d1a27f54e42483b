import { useCallback, useEffect, useReducer, useRef } from 'react';
import { v7 } from 'uuid';
import { useStore } from '#renderer/api.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { AnswerInput, TodayView } from '#shared/contracts/today.ts';
import type { Outbox } from './outbox.ts';
import { misTapId } from './outbox.ts';
import { sendWhileLeaving } from './send-while-leaving.ts';
import { noteServerTime, serverTime } from './server-clock.ts';
import { advance, openShowing, type Sitting, startSitting } from './sitting.ts';

/** Longer than this nobody is kept from the next picture by a slow network. */
const LONGEST_WAIT_MS = 1_500;

/** What a person chose, before it has an id and a time. */
export type Choice = Pick<AnswerInput, 'named' | 'aufBefore' | 'recognitionMs' | 'namingMs'>;

export interface SittingActions {
  begin(): void;
  gotIt(recognitionMs: number): void;
  answer(choice: Choice): void;
  misTap(): void;
  goOn(): void;
}

/** Runs a sitting: answers are stored and sent, verdicts and new showings come in, leaving is noted. */
export function useSitting(view: TodayView, outbox: Outbox | null): [Sitting, SittingActions] {
  const store = useStore();
  const [sitting, dispatch] = useReducer(advance, view, startSitting);
  const latest = useRef(sitting);
  const cache = useRef(store);
  useEffect(() => {
    latest.current = sitting;
    cache.current = store;
  });
  useEffect(() => dispatch({ kind: 'view', view }), [view]);

  useEffect(() => {
    if (!outbox) return;
    const stop = outbox.listen({
      result({ verdicts, today }) {
        noteServerTime(today.serverNow);
        dispatch({ kind: 'verdicts', verdicts, view: today });
        cache.current.put(endpoints.today, {}, today);
      },
      today(next) {
        noteServerTime(next.serverNow);
        cache.current.put(endpoints.today, {}, next);
      },
      notTaken(ids) {
        dispatch({ kind: 'no-verdict', ids });
        // Refused for good: the queue has moved on without this device.
        if (outbox.state.refused) void cache.current.refresh(endpoints.today);
      },
    });
    dispatch({ kind: 'resume', given: outbox.given, unsent: unsentOf(outbox) });
    void outbox.flush();
    return () => {
      stop();
      // Answers may still be on their way: whoever comes back reads the queue anew.
      void cache.current.refresh(endpoints.today);
    };
  }, [outbox]);

  const post = useCallback(
    (showingId: string, choice: Choice): AnswerInput => {
      const at = serverTime();
      const answer: AnswerInput = { id: v7({ msecs: at }), showingId, ...choice, answeredAt: at };
      outbox?.put({ kind: 'answer', id: answer.id, at, body: answer });
      return answer;
    },
    [outbox],
  );

  const sendingId = sitting.phase.kind === 'sending' ? sitting.phase.answer.id : null;
  useEffect(() => {
    if (sendingId === null) return;
    void outbox?.flush();
    const timer = setTimeout(() => dispatch({ kind: 'no-verdict', ids: [sendingId] }), LONGEST_WAIT_MS);
    return () => clearTimeout(timer);
  }, [outbox, sendingId]);

  useEffect(() => {
    // Several signs of leaving may come; the picture after the one that was left has not been seen by anyone.
    let away = false;
    const leave = () => {
      const showing = openShowing(latest.current);
      if (!showing || away) return;
      away = true;
      const answer = post(showing.id, {
        named: 'left',
        aufBefore: null,
        recognitionMs: null,
        namingMs: null,
      });
      latest.current = advance(latest.current, { kind: 'leave', answer });
      dispatch({ kind: 'leave', answer });
      if (outbox) sendWhileLeaving(outbox);
    };
    const onVisibility = () => {
      if (document.visibilityState === 'hidden') return leave();
      away = false;
      void outbox?.flush();
    };
    const onReturn = () => {
      away = false;
    };
    window.addEventListener('pageshow', onReturn);
    document.addEventListener('visibilitychange', onVisibility);
    window.addEventListener('pagehide', leave);
    return () => {
      document.removeEventListener('visibilitychange', onVisibility);
      window.removeEventListener('pagehide', leave);
      window.removeEventListener('pageshow', onReturn);
      leave();
    };
  }, [outbox, post]);

  const actions: SittingActions = {
    begin: () => dispatch({ kind: 'begin' }),
    gotIt: (recognitionMs) => dispatch({ kind: 'got-it', recognitionMs }),
    answer(choice) {
      const showing = openShowing(latest.current);
      if (!showing) return;
      const answer = post(showing.id, choice);
      latest.current = advance(latest.current, { kind: 'answer', answer });
      dispatch({ kind: 'answer', answer });
    },
    misTap() {
      if (sitting.phase.kind !== 'verdict') return;
      const body = { reviewId: sitting.phase.judged.verdict.id, at: serverTime() };
      outbox?.put({ kind: 'mis-tap', id: misTapId(body), at: body.at, body });
      dispatch({ kind: 'mis-tap' });
      void outbox?.flush();
    },
    goOn: () => dispatch({ kind: 'go-on' }),
  };
  return [sitting, actions];
}

function unsentOf(outbox: Outbox): AnswerInput[] {
  return outbox.letters().flatMap((letter) => (letter.kind === 'answer' ? [letter.body] : []));
}
