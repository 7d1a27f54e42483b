import type { LedgerCasesInput } from '#shared/contracts/ledger.ts';
import { LEDGER_SORTS, type LedgerSort } from '#shared/contracts/ledger-lists.ts';
import { readStep, type Step, stepQuery } from '../ledger-query.ts';

type Chosen = Omit<LedgerCasesInput, keyof Step>;

const SORTS: readonly LedgerSort[] = LEDGER_SORTS;
const ANGLES = [1, 2, 4] as const;

/** The list that an address asks for; null where it names no step. What else is not right in it is left out. */
export function casesInputOf(query: URLSearchParams): LedgerCasesInput | null {
  const { step, errors } = readStep(query);
  if (errors.length > 0) return null;
  const angles = ANGLES.find((some) => String(some) === query.get('angles'));
  const group = query.get('group');
  const sort = SORTS.find((one) => one === query.get('sort'));
  const order = query.get('order') === 'descending' ? 'descending' : undefined;
  const page = /^[1-9]\d{0,2}$/.test(query.get('page') ?? '') ? Number(query.get('page')) : undefined;
  return {
    ...step,
    ...(angles ? { angles } : {}),
    ...(group && group.length <= 60 ? { group } : {}),
    ...(sort ? { sort } : {}),
    ...(order ? { order } : {}),
    ...(page ? { page } : {}),
    ...(query.get('size') === 'most' ? { size: 'most' as const } : {}),
  };
}

/** The address of a list of a step's cases. */
export function casesHref(step: Step, chosen: Chosen = {}): string {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(chosen)) {
    if (value !== undefined) query.set(name, String(value));
  }
  return `/ledger/cases?${stepQuery(step)}${query.size > 0 ? `&${query}` : ''}`;
}
