/** One measured figure. */
export interface Figure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
}

/** A bench measures and returns figures; it prints nothing. */
export type Bench = () => Figure[] | Promise<Figure[]>;

const now = (): number => performance.now();

/** Milliseconds of one run of `work`. */
export function milliseconds(work: () => void): number {
  const start = now();
  work();
  return now() - start;
}

/**
 * Runs per second of each of several works, interleaved in `rounds` rounds of at least `span` ms each so
 * that a busy machine is unfair to all of them alike; the median round of each.
 */
export function ratesOf(works: readonly (() => void)[], rounds = 5, span = 100): number[] {
  const rates = works.map((): number[] => []);
  for (let round = 0; round < rounds; round++)
    works.forEach((work, at) => {
      let runs = 0;
      const start = now();
      while (now() - start < span) {
        work();
        runs++;
      }
      rates[at]!.push((runs * 1000) / (now() - start));
    });
  return rates.map((all) => all.sort((a, b) => a - b)[Math.floor(rounds / 2)]!);
}
