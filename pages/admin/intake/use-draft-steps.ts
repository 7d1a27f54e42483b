import { useState } from 'react';
import { useNavigate } from 'react-router';
import { type ApiError, useSend, useStore } from '#renderer/api.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { DraftView, SettleLineInput } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { isBlocking } from './line-filter.ts';
import { stepDone } from './step-done.ts';

export type Step = Pick<SettleLineInput, 'line' | 'decision' | 'caseName' | 'algorithm'>;

export interface DraftSteps {
  /** Settles a line; `done` runs when it is written. */
  settle(step: Step, done?: () => void): void;
  /** The line whose step is under way. */
  readonly busyLine: number | null;
  publish(note: string, done: () => void): void;
  readonly publishing: boolean;
  discard(done: () => void): void;
  readonly discarding: boolean;
  /** What a screen reader is told after a step. */
  readonly said: string;
  /** Someone else was quicker: the draft on the screen was read again. */
  readonly overtaken: string | null;
  /** Why the last step was not written. */
  readonly refused: string | null;
}

/** The steps on a draft, each made on the version that is on the screen. */
export function useDraftSteps({ draft, version }: DraftView): DraftSteps {
  const { draftId } = draft;
  const store = useStore();
  const navigate = useNavigate();
  const [said, setSaid] = useState('');
  const [overtaken, setOvertaken] = useState<string | null>(null);
  const [refused, setRefused] = useState<string | null>(null);

  const clear = () => {
    setOvertaken(null);
    setRefused(null);
  };
  const onError = (error: ApiError) => {
    if (error.status === 412 || error.status === 409) {
      setOvertaken(error.message);
      void store.refresh(endpoints.draft);
      void store.refresh(endpoints.intake);
    } else {
      setRefused(error.message);
    }
  };
  const settling = useSend(endpoints.settleLine, {
    onDone: (view, { line }) => {
      store.put(endpoints.draft, { draftId }, view);
      const settled = view.lines.find((one) => one.line === line);
      const step = settled ? stepDone(settled) : 'none';
      setSaid(intakeText.draft.settled(line, step, view.lines.filter(isBlocking).length));
    },
  });
  const publishing = useSend(endpoints.publish, {
    onDone: () => {
      void store.refresh(endpoints.draft);
      void store.refresh(endpoints.intake);
      void store.refresh(endpoints.catalogue);
    },
  });
  const discarding = useSend(endpoints.discard, {
    onDone: (view) => {
      store.put(endpoints.intake, {}, view);
      void store.refresh(endpoints.draft);
      void navigate('/admin/intake');
    },
  });

  return {
    settle(step, done) {
      clear();
      settling.mutate({ draftId, version, ...step }, { onError, onSuccess: () => done?.() });
    },
    busyLine: settling.isPending ? settling.variables.line : null,
    publish(note, done) {
      clear();
      publishing.mutate({ draftId, version, note }, { onError, onSettled: done });
    },
    publishing: publishing.isPending,
    discard(done) {
      clear();
      discarding.mutate({ draftId, version }, { onError, onSettled: done });
    },
    discarding: discarding.isPending,
    said,
    overtaken,
    refused,
  };
}
