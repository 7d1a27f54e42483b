import { z } from 'zod';
import { caseOfCatalogue, setHead } from './catalogue.ts';
import { picture } from './common.ts';

/** A case as others point to it. */
export const caseReference = z.strictObject({
  setKey: z.string(),
  key: z.string(),
  name: z.string(),
  alias: z.string().nullable(),
  group: z.string(),
  skip: z.boolean(),
  picture,
});
export type CaseReference = z.infer<typeof caseReference>;

const auf = z.int().min(0).max(3);

/** Two looks instead of one: turn, orient, turn, permute, turn. */
const twoLookRoute = z.strictObject({
  before: auf,
  /** null where nothing is left to orient. */
  orient: z.strictObject({ case: caseReference, algorithm: z.string() }).nullable(),
  between: auf,
  /** null where nothing is left to permute. */
  permute: z.strictObject({ case: caseReference, algorithm: z.string() }).nullable(),
  after: auf,
  /** Slice turns, AUFs among them. */
  stm: z.int(),
});
export type TwoLookRoute = z.infer<typeof twoLookRoute>;

export const catalogueCaseInput = z.strictObject({
  setKey: z.string().max(60),
  caseKey: z.string().max(120),
});
export type CatalogueCaseInput = z.infer<typeof catalogueCaseInput>;
export const catalogueCaseView = z.strictObject({
  ...setHead,
  /** The newest edition, which names and algorithms come from; null where none is published. */
  edition: z.int().nullable(),
  case: z.strictObject({ ...caseOfCatalogue, skip: z.boolean() }),
  /** The really different angles; each a turn of the top, clockwise, on from the one before. */
  views: z.array(picture),
  /** Turns before and after that leave the case as it is; the first is none. */
  stabiliser: z.array(z.strictObject({ before: auf, after: auf })),
  mirror: caseReference,
  /** null where inverses are not defined for the set. */
  inverse: caseReference.nullable(),
  mirrorInverse: caseReference.nullable(),
  /** The OLL case it shows and the PLL case its pieces make; null where the set does not see them. */
  orientation: caseReference.nullable(),
  permutation: caseReference.nullable(),
  /** From the first view, shortest first; null where the set does not see the whole last layer or it is oriented. */
  twoLook: z.array(twoLookRoute).nullable(),
  algorithms: z.array(
    z.strictObject({
      algorithm: z.string(),
      note: z.string(),
      counts: z.strictObject({ htm: z.int(), qtm: z.int(), stm: z.int(), etm: z.int() }),
      /** Right AUFs before, by view. */
      rightAufs: z.array(z.array(auf)),
    }),
  ),
  /** Editions in which its algorithms changed, newest first. */
  changes: z.array(
    z.strictObject({
      edition: z.int(),
      publishedAt: z.number(),
      added: z.array(z.string()),
      removed: z.array(z.string()),
      /** The same algorithms in another order. */
      reordered: z.boolean(),
    }),
  ),
  /** The cases before and after it by name. */
  previous: z.strictObject({ key: z.string(), name: z.string() }).nullable(),
  next: z.strictObject({ key: z.string(), name: z.string() }).nullable(),
});
export type CatalogueCaseView = z.infer<typeof catalogueCaseView>;
