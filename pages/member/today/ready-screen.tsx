import { type ReactNode, useEffect, useRef } from 'react';
import { Button, RulerTicks } from '#renderer/ui/index.ts';
import { todayText } from '#shared/text/today.ts';
import type { Progress } from './looking-screen.tsx';

export interface ReadyScreenProps {
  readonly setNames: readonly string[];
  readonly progress: Progress;
  readonly secondsLeft: number;
  /** The club one trains in. */
  readonly club: string;
  readonly note: ReactNode;
  readonly onBegin: () => void;
}

/** Before the first picture: the clock must not start while the page is still arriving. */
export function ReadyScreen({ setNames, progress, secondsLeft, club, note, onBegin }: ReadyScreenProps) {
  const begin = useRef(onBegin);
  const resumed = progress.answered > 0;
  const count = Math.max(0, progress.planned - progress.answered);
  useEffect(() => {
    begin.current = onBegin;
  });
  useEffect(() => {
    // The key is not focused by itself: a ring on the screen would tell a thumb nothing.
    const onKey = (event: KeyboardEvent) => {
      if (event.target !== document.body || (event.key !== ' ' && event.key !== 'Enter')) return;
      event.preventDefault();
      begin.current();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
  return (
    <div className="flex flex-1 flex-col">
      <div className="flex min-h-0 flex-1 items-stretch gap-5 py-5">
        <RulerTicks
          done={progress.answered}
          total={progress.planned}
          label={todayText.progressLabel}
          text={todayText.progressText(progress.answered, progress.planned)}
          className="w-[18px] shrink-0"
        />
        <div className="flex min-w-0 flex-1 flex-col justify-center gap-4">
          <div>
            <p className="text-[2.125rem] font-bold leading-tight">
              {resumed ? todayText.ready.resumed(count) : todayText.ready.heading(count)}
            </p>
            <p className="text-lg text-ink-2">
              {todayText.ready.setsAndTime(todayText.ready.sets(setNames), secondsLeft)}
            </p>
            <p className="text-ink-2">{club}</p>
          </div>
          <div className="max-w-[34rem] space-y-2 border-t border-line pt-4 text-ink-2">
            {todayText.ready.how.map((sentence) => (
              <p key={sentence}>{sentence}</p>
            ))}
          </div>
          {note}
        </div>
      </div>
      <div className="mb-[4.5rem] flex min-h-[11.5rem] basis-[26%]">
        <Button size="half-screen" hint={todayText.ready.hint} onClick={onBegin}>
          {resumed ? todayText.ready.goOn : todayText.ready.begin}
        </Button>
      </div>
    </div>
  );
}
