/** How the Ledger's lists can be sorted, and how long they get. No schema here: pages read it too. */
export const LEDGER_SORTS = ['number', 'name', 'group', 'prior'] as const;
export type LedgerSort = (typeof LEDGER_SORTS)[number];

/** The longest list that is given on one page: ZBLL fits. */
export const MOST_ON_ONE_PAGE = 500;
