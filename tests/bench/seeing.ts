/** What is seen: pictures drawn per second, and the searches that pages wait for. */

import { playAlgorithm } from '#shared/lastlayer/facelets.ts';
import {
  caseSet,
  casesDrawn,
  confusableWith,
  EMPTY_DRAWING,
  painted,
  STATES,
} from '#shared/lastlayer/index.ts';
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { cubeSeatViewSvg } from '#shared/lastlayer/pictures/cube-view.ts';
import { flatViewSvg, seatViewSvg, stickersOf, TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { type Figure, milliseconds, ratesOf } from './bench.ts';

const colouring = TABLE_COLOURING;
/** As many pieces as the seat view has drawn parts. */
const PIECES = 30;

/** Reading a character makes the engine write the pieces of a text out into one. */
const written = (text: string): number => text.charCodeAt(text.length - 1);

/** The same text put together from so many pieces by nothing but +=, and written out. */
function concatenation(text: string): () => void {
  const size = Math.ceil(text.length / PIECES);
  const pieces = Array.from({ length: PIECES }, (_, at) => text.slice(at * size, (at + 1) * size));
  return () => {
    let whole = '';
    for (const piece of pieces) whole += piece;
    written(whole);
  };
}

function pictureRates(): Figure[] {
  let state = 0;
  const next = () => {
    state = (state + 7919) % STATES;
    return stickersOf(state);
  };
  const example = seatViewSvg({ stickers: stickersOf(1), colouring, holding: 'right' });
  const frames = playAlgorithm(0, parseMoves("R U R' U'"));
  const [seat, drawn, plain, flat, cube] = ratesOf([
    () => written(seatViewSvg({ stickers: next(), colouring, holding: 'right' })),
    (() => {
      const stickers = stickersOf(1);
      return () => written(seatViewSvg({ stickers, colouring, holding: 'right' }));
    })(),
    concatenation(example),
    () => written(flatViewSvg({ stickers: next(), colouring })),
    () => written(cubeSeatViewSvg({ facelets: frames[2]!.facelets, colouring, holding: 'left' })),
  ]) as [number, number, number, number, number];
  return [
    { name: 'seat view, from the state', value: seat, unit: 'pictures/s' },
    { name: 'seat view, from the stickers', value: drawn, unit: 'pictures/s' },
    { name: 'plain concatenation of its length', value: plain, unit: 'pictures/s' },
    { name: 'length of a seat view', value: example.length / 1000, unit: 'kB' },
    { name: 'seat view, share of plain concatenation', value: drawn / plain, unit: '×' },
    { name: 'flat view, from the state', value: flat, unit: 'pictures/s' },
    { name: 'whole cube', value: cube, unit: 'pictures/s' },
  ];
}

/** Milliseconds of the first run and of a later one. */
function twice(name: string, work: () => void): Figure[] {
  const first = milliseconds(work);
  return [
    { name: `${name}, first time`, value: first, unit: 'ms' },
    { name: `${name}, again`, value: milliseconds(work), unit: 'ms' },
  ];
}

export function seeingFigures(): Figure[] {
  const [zbll, whole] = [caseSet('zbll'), caseSet('1lll')];
  const drawing = painted(EMPTY_DRAWING, 'front', 1, 'red');
  return [
    ...pictureRates(),
    ...twice('confusable with a ZBLL case', () => confusableWith(zbll, zbll.cases[100]!)),
    ...twice('confusable with a 1LLL case', () => confusableWith(whole, whole.cases[100]!)),
    ...twice('1LLL cases by a drawing', () => casesDrawn(whole, drawing)),
  ];
}
