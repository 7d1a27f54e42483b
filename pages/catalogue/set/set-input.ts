import { CASE_SORTS } from '#shared/contracts/case-sorts.ts';
import type { CatalogueCasesInput, CatalogueSetInput } from '#shared/contracts/catalogue.ts';

type Words = Readonly<Record<string, string | null | undefined>>;

/** What the filters of an address say. What makes no sense in it counts as not said. */
export function filterInput(setKey: string, words: Words): CatalogueCasesInput {
  const { edition, group, angles, algorithms, q, sort } = words;
  return {
    setKey,
    ...(edition && /^[1-9]\d{0,5}$/.test(edition) ? { edition: Number(edition) } : {}),
    ...(group ? { group: group.slice(0, 200) } : {}),
    ...(angles === '1' || angles === '2' || angles === '4' ? { angles } : {}),
    ...(algorithms === 'with' || algorithms === 'without' ? { algorithms } : {}),
    ...(q?.trim() ? { q: q.trim().slice(0, 100) } : {}),
    ...(CASE_SORTS.some((one) => one === sort?.replace(/^-/, '')) ? { sort: sort ?? undefined } : {}),
  };
}

/** The same with the place in the list. */
export function setInput(setKey: string, words: Words): CatalogueSetInput {
  const { after, before } = words;
  return {
    ...filterInput(setKey, words),
    ...(after ? { after: after.slice(0, 120) } : before ? { before: before.slice(0, 120) } : {}),
  };
}

/** The words of an address's query. */
export function wordsOf(search: URLSearchParams): Words {
  return Object.fromEntries(search);
}
