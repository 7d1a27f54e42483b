import type { LedgerCasesInput, LedgerCasesView } from '#shared/contracts/ledger.ts';
import { LEDGER_SORTS, type LedgerSort, MOST_ON_ONE_PAGE } from '#shared/contracts/ledger-lists.ts';
import { inNameOrder } from '../catalogue/read-edition.ts';
import type { Ctx } from '../context.ts';
import { countStep, priorOf, type StepCase, showCase } from './step-cases.ts';

/** Cases on a page of the list, unless the most is asked for. */
const PAGE = 60;

const BY: Readonly<Record<LedgerSort, (one: StepCase, other: StepCase) => number>> = {
  number: () => 0,
  name: (one, other) => inNameOrder(one.name, other.name),
  group: (one, other) => inNameOrder(one.group, other.group),
  prior: (one, other) => one.weight - other.weight,
};

/** The cases of a step one by one, for anyone; a page past the end is the last one. */
export async function listLedgerCases(_ctx: Ctx, input: LedgerCasesInput): Promise<LedgerCasesView> {
  const { ledger, trade, cases } = countStep(input);
  const { angles, group, sort = LEDGER_SORTS[0], order = 'ascending' } = input;
  const sign = order === 'ascending' ? 1 : -1;
  const found = cases
    .filter((one) => angles === undefined || one.angles === angles)
    .filter((one) => group === undefined || one.group === group)
    .sort((one, other) => sign * (BY[sort](one, other) || one.number - other.number));
  const size = input.size === 'most' ? MOST_ON_ONE_PAGE : PAGE;
  const pages = Math.max(1, Math.ceil(found.length / size));
  const page = Math.min(pages, input.page ?? 1);
  return {
    entry: ledger.entry,
    aspects: [...ledger.aspects],
    trade,
    all: cases.length,
    found: found.length,
    page,
    pages,
    from: Math.min(found.length, (page - 1) * size + 1),
    angles: [...new Set(cases.map((one) => one.angles))].sort((one, other) => other - one),
    groups: [...new Set(cases.map((one) => one.group))].filter((one) => one !== '').sort(inNameOrder),
    cases: found.slice((page - 1) * size, page * size).map((one) => {
      const prior = priorOf(one, ledger);
      return {
        ...showCase(one, ledger.seen),
        key: one.key,
        group: one.group,
        angles: one.angles,
        prior,
        dealtOnceIn: { numerator: prior.denominator, denominator: prior.numerator },
        skip: one.skip,
      };
    }),
  };
}
