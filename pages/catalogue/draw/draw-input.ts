import type { DrawnInput } from '#shared/contracts/catalogue-search.ts';
import { type Drawing, EMPTY_DRAWING, readDrawing, writeDrawing } from '#shared/lastlayer/drawing.ts';

/** Looked through while an address names no set. */
const USUAL_SETS: readonly string[] = ['oll', 'pll'];

export interface DrawAddress {
  readonly drawing: Drawing;
  readonly sets: readonly string[];
}

/** What an address says of a drawing; what makes no sense in it counts as not said. */
export function readAddress(search: URLSearchParams): DrawAddress {
  const sets = search.get('sets');
  return {
    drawing: readDrawing(search.get('d') ?? '') ?? EMPTY_DRAWING,
    sets: sets === null ? USUAL_SETS : sets.split(',').filter((key) => /^[a-z0-9-]{1,60}$/u.test(key)),
  };
}

/** The address that says it. */
export function addressOf({ drawing, sets }: DrawAddress): string {
  return `/catalogue/draw?${new URLSearchParams({ d: writeDrawing(drawing), sets: sets.join(',') })}`;
}

export function drawnInput({ drawing, sets }: DrawAddress): DrawnInput {
  return { drawing: writeDrawing(drawing), sets: sets.join(',').slice(0, 400) };
}
