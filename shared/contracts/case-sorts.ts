/** How the cases of a set can be sorted; `-` before the word turns it round. No schema here: pages read it too. */
export const CASE_SORTS = ['number', 'name', 'group', 'prior', 'angles', 'algorithms'] as const;
export type CaseSort = (typeof CASE_SORTS)[number];
