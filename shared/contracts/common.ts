import { z } from 'zod';

export const uuid = z.uuid();
/** Prior of a case as an exact fraction of the entry states. */
export const prior = z.strictObject({ weight: z.int(), total: z.int() });
export type Prior = z.infer<typeof prior>;

/**
 * A figure between 0 and 1 with its 90 % interval; `few` marks one that rests on few answers. `rests` says on what:
 * answers in its own set, only answers to the same cases in another set, or nothing, when no case was answered yet.
 */
export const figure = z.strictObject({
  value: z.number(),
  low: z.number(),
  high: z.number(),
  answers: z.int(),
  few: z.boolean(),
  rests: z.enum(['here', 'elsewhere', 'nothing']),
});
export type Figure = z.infer<typeof figure>;

/** The stickers of a last layer by face letter (shared/lastlayer/pictures). */
export const stickers = z.strictObject({
  top: z.string().length(9),
  front: z.string().length(3),
  right: z.string().length(3),
  back: z.string().length(3),
  left: z.string().length(3),
});

/** One picture to draw: stickers and colours, nothing of the case. */
export const picture = z.strictObject({ stickers, colouring: z.int().min(0).max(23) });
export type Picture = z.infer<typeof picture>;

export const caseStateName = z.enum(['unmet', 'settling', 'holding', 'slipping']);
export const outcome = z.enum(['held', 'late', 'missed', 'left']);
export const holding = z.enum(['right', 'left']);

/** RFC 9457 problem details, with our list of what is wrong where. */
export const problem = z.strictObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  requestId: z.string().optional(),
  errors: z
    .array(
      z.strictObject({
        detail: z.string(),
        /** JSON pointer into the body, or the name of the field. */
        pointer: z.string(),
        row: z.int().optional(),
        column: z.int().optional(),
      }),
    )
    .optional(),
});
export type Problem = z.infer<typeof problem>;
