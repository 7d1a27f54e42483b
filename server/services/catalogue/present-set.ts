import type { Transaction } from '#database/client.ts';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { loadCaseSet } from './load-set.ts';
import type { ShownSet } from './read-shown-set.ts';

type SetHead = Pick<
  CatalogueSetView,
  'setKey' | 'setName' | 'entry' | 'mix' | 'toldApart' | 'solved' | 'parent'
>;

/** What a set is, as the heads of its pages say it. */
export async function presentSet(
  tx: Transaction,
  { set, namedBy }: Pick<ShownSet, 'set' | 'namedBy'>,
): Promise<SetHead> {
  const { key, name, entry, mix, toldApart, solved } = set.definition;
  const parent = namedBy === key ? null : await loadCaseSet(tx, namedBy);
  return {
    setKey: key,
    setName: name,
    entry,
    mix: mix.map((share) => ({ entry: share.entry, parts: share.parts })),
    toldApart: [...toldApart],
    solved: [...solved],
    parent: parent && { setKey: namedBy, name: parent.definition.name },
  };
}
