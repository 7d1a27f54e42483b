import type { CatalogueCaseInput } from '#shared/contracts/catalogue-case.ts';
import type { ConfusableView } from '#shared/contracts/catalogue-search.ts';
import { confusableWith, differsAt, seenThrough } from '#shared/lastlayer/index.ts';
import { TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { findingsText } from '#shared/text/findings.ts';
import { notFound } from '../../http/problem.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { seenStickers } from './case-picture.ts';
import { readAliases } from './read-aliases.ts';
import { readShownSet } from './read-shown-set.ts';
import { referencesIn } from './refer-to-case.ts';

/** Cases named beside one. */
const SHOWN = 6;

/**
 * The cases of a set that look most like one of its cases, in the two views that come nearest.
 * @throws Problem not-found for an unknown set or case.
 */
export async function showConfusable(ctx: Ctx, input: CatalogueCaseInput): Promise<ConfusableView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const shown = await readShownSet(tx, input.setKey);
    const { set } = shown;
    const c = set.byKey(input.caseKey);
    if (!c) throw notFound('There is no such case in that set.');
    const referTo = referencesIn(shown, await readAliases(tx, actor));
    const seen = seenThrough(set.definition.entry, set.definition.toldApart);
    const picture = (state: number) => ({ stickers: seenStickers(set, state), colouring: TABLE_COLOURING });
    const { name, alias } = referTo(c);
    return {
      name: alias ?? name,
      rows: confusableWith(set, c, { count: SHOWN }).map((near) => {
        const other = referTo(near.case);
        const difference = differsAt(near.shown, near.other, near.holding, seen);
        return {
          case: other,
          apart: near.distance,
          mirror: near.mirror,
          holding: near.holding,
          shown: picture(near.shown),
          other: picture(near.other),
          differs: difference
            ? findingsText.differs(difference, alias ?? name, other.alias ?? other.name)
            : findingsText.differsOutOfView,
        };
      }),
    };
  });
}
