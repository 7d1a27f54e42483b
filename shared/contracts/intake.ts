import { z } from 'zod';
import { picture, prior, uuid } from './common.ts';

export const finding = z.enum([
  'agrees',
  'solves-other',
  'first-two-layers-broken',
  'not-a-move',
  'duplicate',
  'not-in-set',
  'missing-field',
]);
export type FindingName = z.infer<typeof finding>;

export const draftSummary = z.strictObject({
  draftId: uuid,
  setKey: z.string(),
  setName: z.string(),
  fileName: z.string(),
  state: z.enum(['open', 'published', 'discarded']),
  lines: z.int(),
  createdAt: z.number(),
  editionNumber: z.int().nullable(),
});
export const intakeView = z.strictObject({
  sets: z.array(
    z.strictObject({
      setKey: z.string(),
      name: z.string(),
      cases: z.int(),
      newestEdition: z.int().nullable(),
    }),
  ),
  drafts: z.array(draftSummary),
});
export type IntakeView = z.infer<typeof intakeView>;

/** The file goes in as text; its name only labels it. */
export const uploadInput = z.strictObject({
  setKey: z.string().min(1, 'Choose the set the file is for.').max(60),
  fileName: z.string().trim().min(1).max(200),
  /** The file's bytes in base64: they are kept as they came. */
  content: z.base64().max(7_000_000, 'The file is larger than 5 MB.'),
});
export type UploadInput = z.infer<typeof uploadInput>;
export const uploadResult = z.strictObject({ draftId: uuid });

export const draftInput = z.strictObject({ draftId: uuid });

export const draftLine = z.strictObject({
  line: z.int(),
  caseName: z.string(),
  algorithm: z.string(),
  group: z.string(),
  note: z.string(),
  /** As in the file, where an edit changed it. */
  original: z.strictObject({ caseName: z.string(), algorithm: z.string() }).nullable(),
  finding,
  /** 1-based place of the first wrong character in the algorithm. */
  column: z.int().nullable(),
  /** The wrong token itself. */
  token: z.string().nullable(),
  /** What the finding says in a sentence, and what can be done about it. */
  says: z.string(),
  hint: z.string(),
  solves: z.string().nullable(),
  prior: prior.nullable(),
  angles: z.int().nullable(),
  picture: picture.nullable(),
  decision: z.enum(['none', 'take', 'drop']),
  /** cannot: blocks until edited or dropped; decide: blocks until taken, edited or dropped; fine: goes in; out: left out. */
  standing: z.enum(['fine', 'decide', 'cannot', 'out']),
});
export type DraftLine = z.infer<typeof draftLine>;

export const draftView = z.strictObject({
  draft: draftSummary,
  version: z.int(),
  lines: z.array(draftLine),
  unknownColumns: z.array(z.string()),
  covered: z.int(),
  of: z.int(),
  /** Names of the set's cases this file has no good line for. */
  missing: z.array(z.string()),
  newestEdition: z.int().nullable(),
  cannot: z.int(),
  toDecide: z.int(),
  /** What publishing would do, merged into the newest edition. */
  effect: z.strictObject({
    newCases: z.int(),
    newAlgorithms: z.int(),
    keptCases: z.int(),
    alreadyThere: z.int(),
  }),
});
export type DraftView = z.infer<typeof draftView>;

export const settleLineInput = z.strictObject({
  draftId: uuid,
  line: z.int().min(1),
  version: z.int().min(1),
  decision: z.enum(['none', 'take', 'drop']),
  caseName: z.string().trim().max(60).optional(),
  algorithm: z.string().trim().max(1000).optional(),
});
export type SettleLineInput = z.infer<typeof settleLineInput>;

export const publishInput = z.strictObject({
  draftId: uuid,
  version: z.int().min(1),
  note: z.string().trim().max(500),
});
export type PublishInput = z.infer<typeof publishInput>;
export const publishResult = z.strictObject({ setKey: z.string(), edition: z.int() });
export const discardInput = z.strictObject({ draftId: uuid, version: z.int().min(1) });
export type DiscardInput = z.infer<typeof discardInput>;
