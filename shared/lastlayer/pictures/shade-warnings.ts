/** Whether the six shades of a palette can be told apart, by people of every colour vision. */
import { deltaE2000, labOf, VISIONS, type Vision } from './colour-difference.ts';
import { COLOUR_NAMES, type ColourName } from './colours.ts';
import { ownPalette } from './palettes.ts';

/** Two shades at least this far apart (CIEDE2000) are told apart at a glance; the safe palette keeps to it. */
export const TOLD_APART = 20;

export interface ShadePair {
  readonly one: ColourName;
  readonly other: ColourName;
  readonly vision: Vision;
  /** CIEDE2000 as that vision sees the two. */
  readonly difference: number;
}

/**
 * All 15 pairs of the six shades in each of four kinds of colour vision.
 * @throws RangeError unless every shade is `#RRGGBB`.
 */
export function shadesApart(colours: Readonly<Record<ColourName, string>>): readonly ShadePair[] {
  const palette = ownPalette(colours);
  return VISIONS.flatMap((vision) => {
    const seen = COLOUR_NAMES.map((name) => labOf(palette.colours[name], vision));
    return COLOUR_NAMES.flatMap((one, a) =>
      COLOUR_NAMES.slice(a + 1).map((other, k) => ({
        one,
        other,
        vision,
        difference: deltaE2000(seen[a]!, seen[a + 1 + k]!),
      })),
    );
  });
}

/**
 * Pairs of shades that come nearer than {@link TOLD_APART}, each once with the vision in which it is
 * nearest, the nearest pair first. Empty for shades that everyone can tell apart.
 * @throws RangeError unless every shade is `#RRGGBB`.
 */
export function tooNear(colours: Readonly<Record<ColourName, string>>): readonly ShadePair[] {
  const near = shadesApart(colours)
    .filter(({ difference }) => difference < TOLD_APART)
    .sort((a, b) => a.difference - b.difference);
  const first = (pair: ShadePair) =>
    near.find(({ one, other }) => one === pair.one && other === pair.other) === pair;
  return near.filter(first);
}
