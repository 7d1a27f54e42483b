import { z } from 'zod';
import { picture, prior } from './common.ts';

export const catalogueView = z.strictObject({
  sets: z.array(
    z.strictObject({
      setKey: z.string(),
      name: z.string(),
      entry: z.string(),
      /** In whole parts, how the solves that reach the set come to it; empty for a single entry. */
      mix: z.array(z.strictObject({ entry: z.string(), parts: z.int() })),
      toldApart: z.array(z.string()),
      solved: z.array(z.string()),
      cases: z.int(),
      /** A club's own, not the installation's. */
      ofClub: z.boolean(),
      /** The set whose editions serve this one: it is a part or a mix of that one's cases. */
      parent: z.strictObject({ setKey: z.string(), name: z.string() }).nullable(),
      editions: z.array(
        z.strictObject({
          number: z.int(),
          publishedAt: z.number(),
          note: z.string(),
          cases: z.int(),
          algorithms: z.int(),
        }),
      ),
    }),
  ),
});
export type CatalogueView = z.infer<typeof catalogueView>;

export const editionInput = z.strictObject({
  setKey: z.string().max(60),
  number: z.coerce.number().int().min(1),
});
export const editionView = z.strictObject({
  setKey: z.string(),
  setName: z.string(),
  number: z.int(),
  publishedAt: z.number(),
  note: z.string(),
  numbers: z.array(z.int()),
  cases: z.array(
    z.strictObject({
      key: z.string(),
      name: z.string(),
      group: z.string(),
      picture,
      prior,
      angles: z.int(),
      algorithms: z.array(z.strictObject({ algorithm: z.string(), note: z.string() })),
    }),
  ),
  missing: z.array(z.string()),
});
export type EditionView = z.infer<typeof editionView>;

const setFilter = {
  setKey: z.string().max(60),
  /** The edition whose names and algorithms are shown; the newest unless given. */
  edition: z.coerce.number().int().min(1).optional(),
  group: z.string().max(200).optional(),
  angles: z.enum(['1', '2', '4']).optional(),
  algorithms: z.enum(['with', 'without']).optional(),
  /** In the name, the alias, the group or an algorithm; a number finds the case of that number. */
  q: z.string().trim().max(100).optional(),
  sort: z
    .string()
    .regex(/^-?(number|name|group|prior|angles|algorithms)$/, 'There is no such order.')
    .optional(),
};

export const catalogueSetInput = z.strictObject({
  ...setFilter,
  /** Key of the case after which the page begins, or before which it ends; not both. */
  after: z.string().max(120).optional(),
  before: z.string().max(120).optional(),
});
export type CatalogueSetInput = z.infer<typeof catalogueSetInput>;

const setHead = {
  setKey: z.string(),
  setName: z.string(),
  entry: z.string(),
  toldApart: z.array(z.string()),
  solved: z.array(z.string()),
};

const caseOfCatalogue = {
  key: z.string(),
  number: z.int(),
  name: z.string(),
  /** What the reader's club calls it. */
  alias: z.string().nullable(),
  group: z.string(),
  prior,
  angles: z.int(),
};

export const catalogueSetView = z.strictObject({
  ...setHead,
  /** The edition shown; null where none is published. */
  edition: z.int().nullable(),
  /** Newest first. */
  editions: z.array(z.strictObject({ number: z.int(), publishedAt: z.number() })),
  /** Cases beside the skip, and how often the skip itself is dealt. */
  cases: z.int(),
  skip: z.strictObject({ key: z.string(), prior }),
  withAlgorithm: z.int(),
  groups: z.array(z.strictObject({ name: z.string(), cases: z.int() })),
  angles: z.array(z.strictObject({ angles: z.int(), cases: z.int() })),
  found: z.int(),
  /** Where the page begins among what was found, from 1; 0 where nothing was. */
  from: z.int(),
  rows: z.array(
    z.strictObject({
      ...caseOfCatalogue,
      picture,
      /** The one shown first; null where there is none. */
      algorithm: z.string().nullable(),
      algorithms: z.int(),
    }),
  ),
  /** Key to go on from, and to go back from. */
  next: z.string().nullable(),
  previous: z.string().nullable(),
});
export type CatalogueSetView = z.infer<typeof catalogueSetView>;

/** All that a filter finds, without pictures: what a file for a spreadsheet is made of. */
export const catalogueCasesInput = z.strictObject(setFilter);
export type CatalogueCasesInput = z.infer<typeof catalogueCasesInput>;
export const catalogueCasesView = z.strictObject({
  setKey: z.string(),
  edition: z.int().nullable(),
  rows: z.array(z.strictObject({ ...caseOfCatalogue, algorithms: z.array(z.string()) })),
});
export type CatalogueCasesView = z.infer<typeof catalogueCasesView>;

/** A case as others point to it. */
const caseReference = z.strictObject({
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
