import { type KeyboardEvent, useEffect, useMemo, useRef, useState } from 'react';
import { CubeView } from '#renderer/ui/cube-view.tsx';
import { Button, cx, printedAlgorithm, Section, SelectField } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import type { Frame } from '#shared/lastlayer/facelets.ts';
import type { Holding } from '#shared/lastlayer/pictures/index.ts';
import { catalogueSearchText } from '#shared/text/catalogue-search.ts';
import { framesOf } from './play.ts';
import { stepAfter } from './step-keys.ts';

const text = catalogueSearchText.steps;

/** An algorithm of the case move by move: the whole cube before and after each. */
export function Stepper({ view }: { view: CatalogueCaseView }) {
  const { algorithms } = view;
  const [chosen, choose] = useState(0);
  const [holding, hold] = useState<Holding>('right');
  const algorithm = algorithms[chosen]?.algorithm ?? algorithms[0]?.algorithm;
  const frames = useMemo(
    () => (algorithm === undefined ? null : framesOf(view, algorithm)),
    [view, algorithm],
  );
  if (!frames) return null;
  return (
    <Section title={text.title} className="screen-only">
      <div className="grid gap-x-5 gap-y-3 pb-5 sm:grid-cols-[minmax(0,1fr)_9rem]">
        {algorithms.length > 1 ? (
          <SelectField
            id="steps-algorithm"
            label={text.algorithm}
            value={String(chosen)}
            onChange={(event) => choose(Number(event.target.value))}
            options={algorithms.map((one, at) => ({
              value: String(at),
              label: printedAlgorithm(one.algorithm),
            }))}
          />
        ) : (
          <span />
        )}
        <SelectField
          id="steps-holding"
          label={text.holding}
          value={holding}
          onChange={(event) => hold(event.target.value === 'left' ? 'left' : 'right')}
          options={(['right', 'left'] as const).map((value) => ({ value, label: text.sides[value] }))}
        />
      </div>
      <Steps key={algorithm} frames={frames} holding={holding} />
    </Section>
  );
}

/** The picture, the keys, and a key for every move. One of the moves is in the tab order: the one shown. */
function Steps({ frames, holding }: { frames: readonly Frame[]; holding: Holding }) {
  const [at, setAt] = useState(0);
  const last = frames.length - 1;
  const moves = useRef<HTMLOListElement>(null);
  const frame = frames[at]!;
  const go = (to: number) => setAt(Math.max(0, Math.min(last, to)));
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const to = stepAfter(event, 'steps', at, last);
    if (to === null) return;
    event.preventDefault();
    setAt(to);
    if (moves.current?.contains(event.target as Node)) moves.current.querySelectorAll('button')[to]?.focus();
  };
  useEffect(() => {
    const onPageKey = (event: globalThis.KeyboardEvent) => {
      if (event.defaultPrevented || event.target !== document.body) return;
      const to = stepAfter(event, 'page', at, last);
      if (to === null) return;
      event.preventDefault();
      setAt(to);
    };
    document.addEventListener('keydown', onPageKey);
    return () => document.removeEventListener('keydown', onPageKey);
  }, [at, last]);
  const says = frame.move ? text.at(at, last, printedAlgorithm(frame.move.text)) : text.atStart(last);
  return (
    <fieldset
      onKeyDown={onKeyDown}
      className="grid min-w-0 items-start gap-x-8 gap-y-4 sm:grid-cols-[15rem_minmax(0,1fr)]"
    >
      <legend className="sr-only">{text.title}</legend>
      <CubeView facelets={frame.facelets} holding={holding} className="mx-auto w-full max-w-60" />
      <div className="min-w-0">
        <ol ref={moves} aria-label={text.moves} className="flex flex-wrap gap-1">
          {frames.map(({ step: n, move }) => (
            <li key={n}>
              <button
                type="button"
                tabIndex={n === at ? 0 : -1}
                aria-current={n === at ? 'step' : undefined}
                onClick={() => go(n)}
                className={cx(
                  'min-h-12 min-w-12 rounded-key px-2 text-lg sm:min-h-9 sm:min-w-9',
                  n === at ? 'bg-ink font-bold text-paper' : 'hover:bg-hair',
                  n > at && 'text-ink-2',
                )}
              >
                {move ? printedAlgorithm(move.text) : text.before}
              </button>
            </li>
          ))}
        </ol>
        <p role="status" className="py-3">
          {says}
        </p>
        <div className="grid max-w-88 grid-cols-4 gap-2">
          <Button kind="outlined" size="small" onClick={() => go(0)}>
            {text.start}
          </Button>
          <Button kind="outlined" size="small" onClick={() => go(at - 1)}>
            {text.back}
          </Button>
          <Button size="small" onClick={() => go(at + 1)}>
            {text.next}
          </Button>
          <Button kind="outlined" size="small" onClick={() => go(last)}>
            {text.end}
          </Button>
        </div>
        <p className="pt-3 text-sm text-ink-2 max-sm:hidden">{text.keys}</p>
      </div>
    </fieldset>
  );
}
