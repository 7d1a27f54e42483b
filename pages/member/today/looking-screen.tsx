import { type PointerEvent, useEffect, useId, useRef, useState } from 'react';
import { Button, RulerTicks, SeatView, VisuallyHidden } from '#renderer/ui/index.ts';
import type { Showing } from '#shared/contracts/today.ts';
import { todayText } from '#shared/text/today.ts';
import { usePainted } from './use-painted.ts';

export interface Progress {
  readonly answered: number;
  readonly planned: number;
}

export interface LookingScreenProps {
  /** Nothing but the picture: what else a showing carries must not reach the markup. */
  readonly picture: Showing['picture'];
  readonly holding: 'right' | 'left';
  readonly progress: Progress;
  /** Said of the showing before, when it was held. */
  readonly passing: string | null;
  /** `recognitionMs`: from the painted picture to the press. */
  readonly onGotIt: (recognitionMs: number) => void;
  readonly onNotRecognised: (elapsedMs: number) => void;
}

/** Without a click after the press (the finger slid off), naming begins all the same, so long after it. */
const NO_CLICK_MS = 80;

/**
 * The picture and the clock. The press stops the clock and takes the picture away; naming begins when the
 * finger is up, so that it cannot land on a name. Mount it anew for each showing.
 */
export function LookingScreen(props: LookingScreenProps) {
  const { picture, holding, progress, passing, onGotIt, onNotRecognised } = props;
  const pictureId = useId();
  const paintedAt = usePainted();
  const stoppedAt = useRef<number | null>(null);
  const finished = useRef(false);
  const key = useRef<HTMLDivElement>(null);
  const [gone, setGone] = useState(false);

  const elapsed = (at: number) =>
    paintedAt.current === null ? null : Math.max(0, Math.round(at - paintedAt.current));
  const stop = (at: number) => {
    if (stoppedAt.current !== null || paintedAt.current === null) return;
    stoppedAt.current = at;
    setGone(true);
  };
  const finish = (at: number) => {
    const ms = elapsed(stoppedAt.current ?? at);
    if (ms === null || finished.current) return;
    finished.current = true;
    onGotIt(ms);
  };

  useEffect(() => {
    key.current?.querySelector('button')?.focus({ preventScroll: true });
  }, []);
  const onKey = useRef<(event: KeyboardEvent) => void>(() => {});
  onKey.current = (event) => {
    if (event.repeat || event.altKey || event.ctrlKey || event.metaKey) return;
    if (event.key !== ' ' && event.key !== 'Enter') return;
    // A link or key that has the focus keeps its own meaning, except the one this is about.
    const target = event.target instanceof Element ? event.target.closest('a, button, summary') : null;
    if (target && !key.current?.contains(target)) return;
    event.preventDefault();
    finish(event.timeStamp);
  };
  useEffect(() => {
    const listener = (event: KeyboardEvent) => onKey.current(event);
    window.addEventListener('keydown', listener);
    return () => window.removeEventListener('keydown', listener);
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
        <div className="relative flex min-w-0 flex-1 flex-col justify-center">
          {passing !== null && (
            <>
              <span aria-hidden="true" className="frame-closes" />
              <p className="absolute end-0 top-0 text-[0.9375rem] text-ink-2">{passing}</p>
            </>
          )}
          <div id={pictureId} className={gone ? 'invisible' : undefined}>
            <SeatView
              stickers={picture.stickers}
              colouring={picture.colouring}
              holding={holding}
              className="mx-auto block max-h-[42dvh] w-full max-w-[26rem]"
            />
          </div>
        </div>
      </div>
      <div ref={key} className="flex min-h-[11.5rem] basis-[26%]">
        <Button
          size="half-screen"
          hint={todayText.gotItHint}
          aria-describedby={pictureId}
          className="touch-none select-none"
          onPointerDown={(event: PointerEvent) => {
            if (event.button === 0) stop(event.timeStamp);
          }}
          onPointerUp={(event: PointerEvent) => {
            const at = event.timeStamp;
            if (stoppedAt.current !== null) setTimeout(() => finish(at), NO_CLICK_MS);
          }}
          onPointerCancel={(event: PointerEvent) => {
            if (stoppedAt.current !== null) finish(event.timeStamp);
          }}
          onClick={(event) => finish(event.timeStamp)}
        >
          {todayText.gotIt}
        </Button>
      </div>
      <div className="flex justify-center py-3">
        <Button
          kind="plain"
          onClick={(event) => {
            const ms = elapsed(event.timeStamp);
            if (ms === null || finished.current) return;
            finished.current = true;
            onNotRecognised(ms);
          }}
        >
          {todayText.notRecognised}
        </Button>
      </div>
      <VisuallyHidden>
        <span role="status">{passing}</span>
      </VisuallyHidden>
    </div>
  );
}
