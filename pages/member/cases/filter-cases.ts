import type { MyCase } from '#shared/contracts/member.ts';

export const SORTS = ['prior', 'name', 'recall', 'next', 'state'] as const;
export type Sort = (typeof SORTS)[number];

/** What the list shows, as it stands in the address. */
export interface CaseFilter {
  /** Set key; '' for all. */
  readonly set: string;
  /** State; '' for all. */
  readonly state: string;
  readonly text: string;
  readonly sort: Sort;
}

const STATE_ORDER: Readonly<Record<MyCase['state'], number>> = {
  slipping: 0,
  settling: 1,
  unmet: 2,
  holding: 3,
};

const names = new Intl.Collator('en', { numeric: true });

/** The filter an address asks for; what it does not know it leaves out. */
export function readFilter(search: URLSearchParams): CaseFilter {
  const sort = search.get('sort') ?? '';
  return {
    set: search.get('set') ?? '',
    state: search.get('state') ?? '',
    text: search.get('find') ?? '',
    sort: SORTS.find((one) => one === sort) ?? 'prior',
  };
}

/** The address part of a filter: only what differs from the plain list. */
export function writeFilter({ set, state, text, sort }: CaseFilter): URLSearchParams {
  const search = new URLSearchParams();
  if (set) search.set('set', set);
  if (state) search.set('state', state);
  if (text) search.set('find', text);
  if (sort !== 'prior') search.set('sort', sort);
  return search;
}

/** The cases that fit, in the order wanted. Text finds names, groups, sets and moves; primes and spaces do not matter. */
export function filterCases(cases: readonly MyCase[], filter: CaseFilter): MyCase[] {
  const words = filter.text.trim() === '' ? [] : [plain(filter.text)];
  return cases
    .filter(
      (c) =>
        (filter.set === '' || c.setKey === filter.set) &&
        (filter.state === '' || c.state === filter.state) &&
        words.every((word) =>
          plain(`${c.setName} ${c.name} ${c.tradeName ?? ''} ${c.group} ${c.algorithm}`).includes(word),
        ),
    )
    .sort((a, b) => compare(a, b, filter.sort) || names.compare(a.name, b.name));
}

function compare(a: MyCase, b: MyCase, sort: Sort): number {
  switch (sort) {
    case 'prior':
      return b.prior.weight / b.prior.total - a.prior.weight / a.prior.total;
    case 'name':
      return names.compare(`${a.setName} ${a.name}`, `${b.setName} ${b.name}`);
    case 'recall':
      return (a.recall ?? -1) - (b.recall ?? -1);
    case 'next':
      return names.compare(a.nextDate ?? '9999', b.nextDate ?? '9999');
    case 'state':
      return STATE_ORDER[a.state] - STATE_ORDER[b.state];
  }
}

function plain(text: string): string {
  return text.toLowerCase().replaceAll('′', "'").replaceAll('’', "'").replace(/\s+/g, '');
}
