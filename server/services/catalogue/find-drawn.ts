import type { DrawnInput, DrawnView } from '#shared/contracts/catalogue-search.ts';
import {
  casesDrawn,
  colouringOf,
  type Drawing,
  type DrawingProblem,
  drawingProblems,
  EMPTY_DRAWING,
  readDrawing,
} from '#shared/lastlayer/index.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { seenStickers } from './case-picture.ts';
import { readAliases } from './read-aliases.ts';
import { readShownSet, type ShownSet } from './read-shown-set.ts';
import { type ReferTo, referencesIn } from './refer-to-case.ts';

/** Cases of one set that are shown; the rest are counted. */
const SHOWN = 24;
/** Sets looked through at once. */
const MOST_SETS = 20;

/**
 * The cases of sets that look like a drawing, or why it is of no cube.
 * @throws Problem not-found for a set this session may not see.
 */
export async function findDrawn(ctx: Ctx, input: DrawnInput): Promise<DrawnView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const drawing = readDrawing(input.drawing) ?? EMPTY_DRAWING;
    const problems = drawingProblems(drawing).map((problem) => ({
      says: drawingText.says(problem),
      sites: sitesOf(problem),
    }));
    const keys = [...new Set((input.sets ?? '').split(',').filter(Boolean))].slice(0, MOST_SETS);
    const aliases = await readAliases(tx, actor);
    const sets: DrawnView['sets'] = [];
    for (const key of keys) {
      const shown = await readShownSet(tx, key);
      sets.push(foundIn(shown, drawing, referencesIn(shown, aliases)));
    }
    return { drawing: input.drawing, problems, sets };
  });
}

function sitesOf(problem: DrawingProblem): DrawnView['problems'][number]['sites'] {
  return 'sites' in problem ? problem.sites.map(([side, index]) => ({ side, index })) : [];
}

function foundIn({ set }: ShownSet, drawing: Drawing, referTo: ReferTo): DrawnView['sets'][number] {
  const found = casesDrawn(set, drawing);
  const colouring = colouringOf(drawing);
  return {
    set: { setKey: set.definition.key, name: set.definition.name },
    cases: set.cases.length,
    found: found.length,
    rows: found.slice(0, SHOWN).map(({ case: of, states, example }) => ({
      case: referTo(of),
      picture: { stickers: seenStickers(set, example), colouring },
      states,
      of: set.statesOf(of).length,
    })),
  };
}
