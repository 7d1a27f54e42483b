import { greatestDivisor } from '../lastlayer/fractions.ts';

const MINUS = '−';

const whole = (n: number) => n.toLocaleString('en-GB');

/** Numbers as every page writes them: figures whole, a true minus, a unit a space away. */
export const numberText = {
  /** A share 0..1 in per cent. */
  percent: (share: number, digits = 0) => `${(share * 100).toFixed(digits)}%`,
  /** Milliseconds in seconds: `3 s`, `2.5 s`; with `digits`, always so many. */
  seconds: (ms: number, digits?: number) =>
    `${digits === undefined ? Number((ms / 1000).toFixed(2)) : (ms / 1000).toFixed(digits)} s`,
  /** A prior as one in how many: whole where it is, else with two decimals at most. */
  oneIn: ({ weight, total }: { readonly weight: number; readonly total: number }) =>
    `1 in ${(total / weight).toLocaleString('en-GB', { maximumFractionDigits: 2 })}`,
  /** A prior exactly, in lowest terms: 1/18, 2/27, 19/19,440. */
  fraction: ({ weight, total }: { readonly weight: number; readonly total: number }) => {
    const divisor = greatestDivisor(weight, total);
    return `${whole(weight / divisor)}/${whole(total / divisor)}`;
  },
  /** A whole number, thousands set off. */
  whole,
  /** Some of a thing: `1 case`, `3,916 cases`. */
  count: (n: number, one: string, many: string) => `${whole(n)} ${n === 1 ? one : many}`,
  /** A change with its sign: `+2`, `−6`, `0`. */
  points: (n: number) => {
    const rounded = Math.round(n);
    return rounded === 0 ? '0' : rounded > 0 ? `+${rounded}` : `${MINUS}${-rounded}`;
  },
} as const;
