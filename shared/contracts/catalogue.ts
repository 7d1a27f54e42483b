import { z } from 'zod';
import { picture, prior } from './common.ts';

/** In whole parts, how the solves that reach a set come to it; empty for a single entry. */
const mix = z.array(z.strictObject({ entry: z.string(), parts: z.int() }));
/** The set whose editions serve this one: it is a part or a mix of that one's cases. */
const parent = z.strictObject({ setKey: z.string(), name: z.string() }).nullable();

export const catalogueView = z.strictObject({
  sets: z.array(
    z.strictObject({
      setKey: z.string(),
      name: z.string(),
      entry: z.string(),
      mix,
      toldApart: z.array(z.string()),
      solved: z.array(z.string()),
      cases: z.int(),
      /** A club's own, not the installation's. */
      ofClub: z.boolean(),
      parent,
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

/** What a set is, at the head of its views. */
export const setHead = {
  setKey: z.string(),
  setName: z.string(),
  entry: z.string(),
  mix,
  toldApart: z.array(z.string()),
  solved: z.array(z.string()),
  /** A club's own, not the installation's. */
  ofClub: z.boolean(),
  /** When it was retired; null for a set in use. */
  retiredAt: z.number().nullable(),
  /** The set whose editions serve this one, with how many cases it has beside the skip. */
  parent: z.strictObject({ setKey: z.string(), name: z.string(), cases: z.int() }).nullable(),
};

/** What the catalogue's lists say of a case. */
export const caseOfCatalogue = {
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
  /** Whether the reader could retire the set, were it in no use. */
  retirable: z.boolean(),
  /** What it is in use for, in a sentence, where the reader could retire it otherwise. */
  inUse: z.string().nullable(),
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
