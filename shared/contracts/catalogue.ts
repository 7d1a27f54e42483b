import { z } from 'zod';
import { picture, prior } from './common.ts';

export const catalogueView = z.strictObject({
  sets: z.array(
    z.strictObject({
      setKey: z.string(),
      name: z.string(),
      entry: z.string(),
      toldApart: z.array(z.string()),
      solved: z.array(z.string()),
      cases: z.int(),
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
