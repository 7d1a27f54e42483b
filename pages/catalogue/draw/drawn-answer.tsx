import type { DrawnView } from '#shared/contracts/catalogue-search.ts';
import { drawingText as text } from '#shared/text/drawing.ts';

/**
 * What the drawing comes to, in a line or two beside the grid: how many cases of each set look like it, or what is
 * wrong with it. It keeps its room, so that the grid does not move under the finger.
 */
export function DrawnAnswer({ view }: { view: DrawnView | undefined }) {
  return (
    <div role="status" className="min-h-12 max-w-[21rem] text-[0.9375rem] leading-snug">
      {view && view.problems.length > 0 && (
        <div className="border-s-4 border-rose ps-3">
          <p className="font-bold">{text.wrong}</p>
          {view.problems.map(({ says }) => (
            <p key={says}>{says}</p>
          ))}
        </div>
      )}
      {view && view.problems.length === 0 && (
        <ul className="flex flex-wrap gap-x-5">
          {view.sets.map(({ set, cases, found }) => (
            // The skip is looked for among the cases.
            <li key={set.setKey}>{text.foundIn(set.name, found, cases + 1)}</li>
          ))}
        </ul>
      )}
    </div>
  );
}
