import { z } from 'zod';
import { picture, prior } from './common.ts';
import { ASPECTS, ENTRIES } from './entries.ts';

const aspect = z.enum(ASPECTS);
const entry = z.enum(ENTRIES);
const name = z
  .string()
  .trim()
  .min(1, 'Give the set a name.')
  .max(40, 'A name has at most 40 characters.')
  .regex(/^\P{Cc}*$/u, 'Control characters cannot be taken.');

/** Parts of the solves that reach the step by this entry; of one entry alone the number does not matter. */
export const entryPart = z.strictObject({
  entry,
  parts: z.int().min(1, 'A share is at least 1.').max(1000, 'A share is at most 1000.'),
});
export type EntryPart = z.infer<typeof entryPart>;

const entries = z.array(entryPart).min(1, 'Choose how the solves arrive.').max(15);
const structure = { entries, toldApart: z.array(aspect).max(4), solved: z.array(aspect).max(4) };

/** A new set: of its own definition, or of some of another's cases. */
export const defineSetInput = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('whole'), name, ...structure }),
  z.strictObject({
    kind: z.literal('subset'),
    name,
    parentKey: z.string().min(1).max(60),
    caseKeys: z.array(z.string().max(120)).min(1, 'Choose at least one case.').max(4000),
  }),
]);
export type DefineSetInput = z.infer<typeof defineSetInput>;
export const definedSet = z.strictObject({ setKey: z.string() });

const list = z
  .string()
  .max(300)
  .regex(/^([a-z+]+(:\d{1,4})?(,|$))*$/u, 'Words, with commas between them.');
/** It comes in an address: `entries` as `eo:2,any:3`, a share left out is 1; aspects as `co,cp`. */
export const previewSetInput = z.strictObject({ entries: list, toldApart: list, solved: list });
export type PreviewSetInput = z.infer<typeof previewSetInput>;

/** What a definition comes to before it is made. */
export const setPreview = z.strictObject({
  /** Why it cannot be a set, in a sentence; null if it can. */
  problem: z.string().nullable(),
  /** null while there is a problem with the definition itself. */
  counts: z
    .strictObject({
      /** What all ways to arrive have in common. */
      entry,
      /** Beside the skip. */
      cases: z.int(),
      /** Different full states that reach the step. */
      states: z.int(),
      /** Denominator of all priors. */
      total: z.int(),
      skip: prior,
      /** Cases alike in angles and prior, the likeliest first. */
      classes: z.array(z.strictObject({ angles: z.int(), cases: z.int(), prior })),
    })
    .nullable(),
  /** The trade's set with the same cases, whatever its algorithms solve. */
  like: z.string().nullable(),
  /** A set whose editions would serve this one: it has all its cases. */
  algorithmsFrom: z.strictObject({ setKey: z.string(), name: z.string() }).nullable(),
});
export type SetPreview = z.infer<typeof setPreview>;

export const setKeyInput = z.strictObject({ setKey: z.string().min(1).max(60) });

/** A set's cases with what they can be chosen by. */
export const caseChoices = z.strictObject({
  setKey: z.string(),
  name: z.string(),
  total: z.int(),
  cases: z.array(
    z.strictObject({
      key: z.string(),
      name: z.string(),
      alias: z.string().nullable(),
      /** Empty if the set has none. */
      group: z.string(),
      /** Corner orientation, edge orientation and corner permutation by their words; null where not told apart. */
      corners: z.string().nullable(),
      edges: z.string().nullable(),
      swap: z.string().nullable(),
      weight: z.int(),
      picture,
      /** Whether the newest edition has an algorithm for it. */
      known: z.boolean(),
    }),
  ),
});
export type CaseChoices = z.infer<typeof caseChoices>;

export const caseOfSetInput = z.strictObject({
  setKey: z.string().min(1).max(60),
  key: z.string().min(1).max(120),
});
export const setAliasInput = z.strictObject({
  ...caseOfSetInput.shape,
  alias: z
    .string()
    .trim()
    .min(1, 'Type what your club calls the case.')
    .max(24, 'An alias has at most 24 characters.')
    .regex(/^\P{Cc}*$/u, 'Control characters cannot be taken.'),
});
export type SetAliasInput = z.infer<typeof setAliasInput>;
export const aliasView = z.strictObject({ alias: z.string().nullable() });
