import type { ReactNode } from 'react';
import {
  AppLink,
  BigNumber,
  BigNumbers,
  EmptyState,
  FlatView,
  Section,
  TextLink,
} from '#renderer/ui/index.ts';
import type { SittingSummary, TodayView } from '#shared/contracts/today.ts';
import { todayText } from '#shared/text/today.ts';
import { caseHref } from '../case-href.ts';
import { MoveBar } from './move-bar.tsx';

const text = todayText.summary;

/** The end of a day's queue: what it moved, what was lost, what tomorrow brings. Or why there is none. */
export function OverScreen({ view, saved, note }: { view: TodayView; saved: boolean; note: ReactNode }) {
  const words = todayText.empty[view.empty ?? 'done'];
  return (
    <div className="flex flex-1 flex-col gap-8 py-6">
      {view.summary ? (
        <Summary summary={view.summary} />
      ) : (
        <EmptyState title={words.title}>
          <p>{words.detail}</p>
        </EmptyState>
      )}
      {note}
      {view.summary && saved && <p className="text-[0.9375rem] text-ink-2">{todayText.answers.saved}</p>}
      <p className="flex gap-6">
        <TextLink href="/cases">{todayText.toCases}</TextLink>
        <TextLink href="/form">{todayText.toForm}</TextLink>
      </p>
    </div>
  );
}

function Summary({ summary }: { summary: SittingSummary }) {
  const { held, late, missed, left, newCases, medianRecognitionMs, minutes } = summary;
  return (
    <>
      <div>
        <h2 className="text-2xl font-bold">{text.title}</h2>
        <p className="pb-4 text-ink-2">{text.why}</p>
        <BigNumbers>
          <BigNumber value={String(held)} label={text.held} />
          <BigNumber value={String(late)} label={text.late} tone={late > 0 ? 'ink' : 'quiet'} />
          <BigNumber value={String(missed)} label={text.missed} tone={missed > 0 ? 'rose' : 'quiet'} />
          {left > 0 && <BigNumber value={String(left)} label={text.left} />}
          {newCases > 0 && <BigNumber value={String(newCases)} label={text.newCases} />}
          {medianRecognitionMs !== null && (
            <BigNumber value={text.seconds(medianRecognitionMs)} label={text.median} />
          )}
          <BigNumber value={text.minutes(minutes)} label={text.time} />
        </BigNumbers>
      </div>
      {summary.moved.length > 0 && (
        <Section title={text.moved} aside={text.movedNote}>
          <ul className="divide-y divide-hair border-t border-hair">
            {summary.moved.map((set) => (
              <li key={set.setKey} className="grid grid-cols-[4rem_1fr_auto] items-center gap-4 py-3">
                <span className="font-bold">{set.name}</span>
                <MoveBar before={set.before} now={set.now} />
                <span aria-hidden="true">{text.movedText(set.before, set.now)}</span>
                <span className="sr-only">{text.movedLabel(set.name, set.before, set.now)}</span>
              </li>
            ))}
          </ul>
        </Section>
      )}
      <Section title={text.lost}>
        {summary.lostCases.length === 0 ? (
          <p className="text-ink-2">{text.lostNone}</p>
        ) : (
          <ul className="grid grid-cols-[repeat(auto-fill,minmax(5.5rem,1fr))] gap-3">
            {summary.lostCases.map((lost) => (
              <li key={lost.key}>
                <AppLink href={caseHref(lost.key)} className="block hover:underline">
                  <FlatView
                    stickers={lost.picture.stickers}
                    colouring={lost.picture.colouring}
                    className="w-20"
                  />
                  <span className="block w-20 text-center text-[0.9375rem] leading-tight">
                    {lost.setName} <b>{lost.name}</b>
                  </span>
                </AppLink>
              </li>
            ))}
          </ul>
        )}
      </Section>
      <Section title={text.tomorrow}>
        <p>{text.tomorrowText(summary.tomorrow.due, summary.tomorrow.fresh, summary.tomorrow.minutes)}</p>
      </Section>
    </>
  );
}
