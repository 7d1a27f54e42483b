import {
  type Colouring,
  type ColourName,
  type CrossColours,
  colouringsFor,
  paint,
} from '#shared/lastlayer/pictures/index.ts';

/** What training shows for some cross colours: the colours it puts on top, and one way it holds the cube. */
export interface TrainingTop {
  readonly tops: readonly ColourName[];
  readonly colouring: Colouring;
}

/**
 * The top is opposite the cross. Where there are several tops, the colouring has one other than yellow: tables have
 * yellow on top, and the two together bring in all six colours.
 */
export function trainingTop(cross: CrossColours): TrainingTop {
  const held = colouringsFor(cross);
  const topOf = (colouring: Colouring) => paint('U', colouring);
  const tops = [...new Set(held.map(topOf))];
  const top = tops.find((one) => one !== 'yellow') ?? tops[0];
  const withTop = held.filter((one) => topOf(one) === top);
  const colouring = withTop.find((one) => paint('F', one) === 'green') ?? withTop[0];
  if (colouring === undefined) throw new RangeError(`No cube is held for a cross of ${cross}.`);
  return { tops, colouring };
}
