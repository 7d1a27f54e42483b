export interface TypedName {
  readonly value: string;
  readonly text: string;
  /** Only a full name is taken from typing alone; other keys are found, not pressed. */
  readonly isName: boolean;
}

/** What typed letters mean among the keys of a grid. */
export type Typed =
  | { readonly kind: 'none' }
  /** The key to go to; several may still be meant. */
  | { readonly kind: 'at'; readonly index: number }
  /** No other name begins like this: it is meant. */
  | { readonly kind: 'pick'; readonly index: number };

/** Reads typed letters: "g" goes to the first name in G, "gb" picks Gb, "t" picks T when nothing else begins so. */
export function readTyped(keys: readonly TypedName[], letters: string): Typed {
  const wanted = letters.toLowerCase();
  const begin = keys.flatMap((key, index) => (key.text.toLowerCase().startsWith(wanted) ? [index] : []));
  const exact = begin.find((index) => keys[index]?.text.toLowerCase() === wanted);
  const index = exact ?? begin[0];
  if (wanted === '' || index === undefined) return { kind: 'none' };
  return exact !== undefined && begin.length === 1 && keys[index]?.isName
    ? { kind: 'pick', index }
    : { kind: 'at', index };
}
