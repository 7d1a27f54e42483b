import { forecastSeconds, type LoadRequest } from './forecast-load.ts';
import { mixedPrior, WANTED_MIN } from './wanted.ts';

/** β is solved to this; finer steps change no queue. */
const BETA_STEP = 2 ** -12;

/**
 * The β whose forecast load matches the member's seconds a day: bisected, to 1/4096. 0 when even the
 * highest wanted retention fits; when even the lowest does not, the β at which every case has it.
 *
 * @throws RangeError if the seconds are not above nothing.
 */
export function solveBeta(request: LoadRequest & { readonly seconds: number }): number {
  if (!(request.seconds > 0)) throw new RangeError('β needs some seconds a day to fit into.');
  const cases = request.cards.length;
  if (cases === 0) return 0;
  let low = 0;
  let high = 0;
  for (const { prior } of request.cards) {
    high = Math.max(high, (1 - WANTED_MIN) * Math.sqrt(cases * mixedPrior(prior, cases)));
  }
  if (forecastSeconds(request, low) <= request.seconds) return low;
  while (high - low > BETA_STEP) {
    const middle = (low + high) / 2;
    if (forecastSeconds(request, middle) > request.seconds) low = middle;
    else high = middle;
  }
  return Math.ceil(high / BETA_STEP) * BETA_STEP;
}
