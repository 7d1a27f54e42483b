import { z } from 'zod';
import { picture, prior } from './common.ts';

export const catalogueSheetInput = z.strictObject({
  setKey: z.string().max(60),
  /** The newest unless given. */
  edition: z.coerce.number().int().min(1).optional(),
  group: z.string().max(200).optional(),
});
export type CatalogueSheetInput = z.infer<typeof catalogueSheetInput>;

/** The algorithm sheet: an edition's cases by group, each with what solves it. */
export const catalogueSheetView = z.strictObject({
  setKey: z.string(),
  setName: z.string(),
  edition: z.int(),
  publishedAt: z.number(),
  /** All groups of the edition, whichever is shown. */
  groupNames: z.array(z.string()),
  groups: z.array(
    z.strictObject({
      /** Empty where the set has no groups. */
      name: z.string(),
      cases: z.array(
        z.strictObject({
          key: z.string(),
          name: z.string(),
          alias: z.string().nullable(),
          picture,
          prior,
          algorithms: z.array(
            z.strictObject({
              algorithm: z.string(),
              /** AUF that it needs before it from where the picture shows the case, in quarter turns U 0..3. */
              auf: z.int().min(0).max(3),
            }),
          ),
        }),
      ),
    }),
  ),
});
export type CatalogueSheetView = z.infer<typeof catalogueSheetView>;
