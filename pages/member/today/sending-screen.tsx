import { RulerTicks } from '#renderer/ui/index.ts';
import { todayText } from '#shared/text/today.ts';
import type { Progress } from './looking-screen.tsx';

/** Between an answer and its verdict: the picture's frame, empty. Seldom longer than a blink. */
export function SendingScreen({ progress }: { progress: Progress }) {
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
        <div className="flex min-w-0 flex-1 items-center justify-center border-[3px] border-ink">
          <p role="status" className="appear-late text-ink-2">
            {todayText.sending}
          </p>
        </div>
      </div>
      <div className="mb-[4.5rem] min-h-[11.5rem] basis-[26%]" />
    </div>
  );
}
