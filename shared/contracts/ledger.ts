import { z } from 'zod';
import { ASPECTS, type Aspect, EVERY_ENTRY } from '../lastlayer/index.ts';
import { ledgerText } from '../text/ledger.ts';
import { picture } from './common.ts';
import { LEDGER_SORTS } from './ledger-lists.ts';

const { problems } = ledgerText;

/** An exact fraction in lowest terms. */
export const fraction = z.strictObject({ numerator: z.int(), denominator: z.int() });
export type Fraction = z.infer<typeof fraction>;

const entry = z.enum(EVERY_ENTRY, { error: () => problems.entry(EVERY_ENTRY) });
const aspect = z.enum(ASPECTS, { error: () => problems.aspects(ASPECTS) });

/** A list, `cp,ep`, or the name repeated as a form sends it; none is an empty list. In the order co, eo, cp, ep. */
const aspects = z.preprocess(
  (value) =>
    (Array.isArray(value) ? value : [value ?? ''])
      .flatMap((part) => (typeof part === 'string' ? part.split(',') : [part]))
      .filter((word) => word !== ''),
  z.array(aspect).transform((list): readonly Aspect[] => ASPECTS.filter((one) => list.includes(one))),
);

/** Per cent of solves, from 1 to 99. */
const share = z.coerce
  .number({ error: () => problems.share })
  .int(problems.share)
  .min(1, problems.share)
  .max(99, problems.share);

/** How many really different pictures a case has. */
const angles = z.union([z.literal(1), z.literal(2), z.literal(4)]);

/** A step: what is solved on arrival, and what is told apart. */
const step = { entry, aspects };

export const ledgerStepInput = z.strictObject(step);

export const ledgerInput = z
  .strictObject({
    ...step,
    /** Another entry condition that some solves arrive with. */
    with: entry.optional(),
    /** The per cent of solves that do. */
    share: share.optional(),
  })
  .refine((input) => (input.with === undefined) === (input.share === undefined), {
    error: problems.mixHalf,
    path: ['share'],
  })
  .refine((input) => input.with !== input.entry, { error: problems.mixSame, path: ['with'] });
export type LedgerInput = z.infer<typeof ledgerInput>;

const shownCase = z.strictObject({ number: z.int(), name: z.string(), picture });
export type ShownCase = z.infer<typeof shownCase>;

const counted = z.strictObject({ value: z.int(), factors: z.array(z.int()), divisors: z.array(z.int()) });
export type LedgerCount = z.infer<typeof counted>;

const caseClass = z.strictObject({
  angles,
  cases: z.int(),
  prior: fraction,
  dealtOnceIn: fraction,
  /** The first few of its cases, in canonical order. */
  shown: z.array(shownCase),
});
export type LedgerClass = z.infer<typeof caseClass>;

const mixClass = z.strictObject({
  cases: z.int(),
  /** Under the first entry condition, under the second, and as solves arrive. */
  first: fraction,
  second: fraction,
  mixed: fraction,
  dealtOnceIn: fraction,
  shown: z.array(shownCase),
});
export type MixClass = z.infer<typeof mixClass>;

const tradeSet = z.strictObject({ key: z.string(), name: z.string() }).nullable();

export const ledgerView = z.strictObject({
  entry,
  aspects: z.array(aspect),
  /** What a case is seen through: the aspects told apart with those done on arrival. */
  seen: z.array(aspect),
  /** Full last-layer states that arrive so. */
  entryStates: z.int(),
  /** The trade's set with the same cases, if it has one. */
  trade: tradeSet,
  assemblies: counted,
  solvable: counted,
  withoutAufAfter: counted,
  cases: z.int(),
  /** The trade's sets for this entry, each with what it tells apart beyond what is done. */
  tradeSets: z.array(z.strictObject({ name: z.string(), aspects: z.array(aspect) })),
  /** The likeliest first; `of` is the common denominator of all priors. */
  classes: z.array(caseClass),
  of: z.int(),
  /** States, as seen, that U^before and U^after together leave as they are: at before · 4 + after. */
  burnside: z.array(z.int()).length(16),
  upToMirror: z.int(),
  /** null where the inverse of a case is not defined. */
  upToInverse: z.int().nullable(),
  upToMirrorAndInverse: z.int().nullable(),
  mix: z.strictObject({ with: entry, share: z.int(), cases: z.int(), classes: z.array(mixClass) }).nullable(),
});
export type LedgerView = z.infer<typeof ledgerView>;

export const ledgerCasesInput = z.strictObject({
  ...step,
  /** Only cases with so many angles. */
  angles: z.coerce.number().pipe(angles).optional(),
  group: z.string().max(60).optional(),
  sort: z.enum(LEDGER_SORTS).optional(),
  order: z.enum(['ascending', 'descending']).optional(),
  page: z.coerce.number().int().min(1).max(1000).optional(),
  /** As much on a page as is ever given, for print; usually 60. */
  size: z.literal('most').optional(),
});
export type LedgerCasesInput = z.infer<typeof ledgerCasesInput>;

const listedCase = shownCase.extend({
  key: z.string(),
  group: z.string(),
  angles,
  prior: fraction,
  dealtOnceIn: fraction,
  skip: z.boolean(),
});
export type ListedCase = z.infer<typeof listedCase>;

export const ledgerCasesView = z.strictObject({
  entry,
  aspects: z.array(aspect),
  trade: tradeSet,
  /** Cases of the step, and of those the ones asked for. */
  all: z.int(),
  found: z.int(),
  page: z.int(),
  pages: z.int(),
  /** Place of the page's first case among those found, from 1. */
  from: z.int(),
  angles: z.array(angles),
  groups: z.array(z.string()),
  cases: z.array(listedCase),
});
export type LedgerCasesView = z.infer<typeof ledgerCasesView>;
