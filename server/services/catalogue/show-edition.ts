import type { EditionView } from '#shared/contracts/catalogue.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { casePicture } from './case-picture.ts';
import { inNameOrder, readEditionContent } from './read-edition.ts';
import { readShownSet } from './read-shown-set.ts';

/** One edition: its cases in the order of their names, and what the set has beyond them. @throws Problem not-found. */
export async function showEdition(
  ctx: Ctx,
  { setKey, number }: { setKey: string; number: number },
): Promise<EditionView> {
  return asSignedIn(ctx, async (tx) => {
    const { set, editions } = await readShownSet(tx, setKey);
    const content = await readEditionContent(tx, setKey, number);
    return {
      setKey,
      setName: content.setName,
      number,
      publishedAt: content.publishedAt.getTime(),
      note: content.note,
      numbers: editions.map((edition) => edition.number),
      cases: [...content.cases.values()].map(({ key, name, group, algorithms }) => {
        const c = set.byKey(key);
        if (!c) throw new Error(`Edition ${number} of ${setKey} holds ${key}, which is no case of the set.`);
        return {
          key,
          name,
          group,
          picture: casePicture(set, c, algorithms[0]?.algorithm),
          prior: { weight: c.weight, total: set.total },
          angles: c.angles,
          algorithms: algorithms.map(({ algorithm, note }) => ({ algorithm, note })),
        };
      }),
      missing: set.cases
        .filter(({ key }) => !content.cases.has(key))
        .map(({ name }) => name)
        .sort(inNameOrder),
    };
  });
}
