import type { Transaction } from '#database/client.ts';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { isTradeSet, loadCaseSet } from './load-set.ts';
import type { ShownSet } from './read-shown-set.ts';
import { readSetRow } from './set-row.ts';

type SetHead = Pick<
  CatalogueSetView,
  'setKey' | 'setName' | 'entry' | 'mix' | 'toldApart' | 'solved' | 'ofClub' | 'retiredAt' | 'parent'
>;

/** What a set is, as the heads of its pages say it. */
export async function presentSet(
  tx: Transaction,
  { set, namedBy }: Pick<ShownSet, 'set' | 'namedBy'>,
): Promise<SetHead> {
  const { key, name, entry, mix, toldApart, solved } = set.definition;
  const row = isTradeSet(key) ? null : await readSetRow(tx, key);
  const parent = namedBy === key ? null : await loadCaseSet(tx, namedBy);
  return {
    setKey: key,
    setName: name,
    entry,
    mix: mix.map((share) => ({ entry: share.entry, parts: share.parts })),
    toldApart: [...toldApart],
    solved: [...solved],
    ofClub: row !== null && row.clubId !== null,
    retiredAt: row?.retiredAt?.getTime() ?? null,
    parent: parent && {
      setKey: namedBy,
      name: parent.definition.name,
      cases: parent.cases.length,
    },
  };
}
