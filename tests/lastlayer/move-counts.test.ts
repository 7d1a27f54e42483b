import { Alg } from 'cubing/alg';
import {
  experimentalCountMetricMoves as countedBy,
  ExperimentalCommonMetric as Metric,
} from 'cubing/notation';
import { cube3x3x3 } from 'cubing/puzzles';
import { describe, expect, it } from 'vitest';
import { moveCounts } from '#shared/lastlayer/index.ts';
import { anyTurns } from './support/algorithms.ts';
import { seeded } from './support/random.ts';

describe('the length of an algorithm', () => {
  it.each([
    // Derived by counting: a slice is two faces, a turn of the whole cube none but in ETM.
    ["R U R' U R U2 R'", { htm: 7, qtm: 8, stm: 7, etm: 7 }],
    ['M2 U M2 U2 M2 U M2', { htm: 11, qtm: 20, stm: 7, etm: 7 }],
    ["x R' U R' D2 R U' R' D2 R2 x'", { htm: 9, qtm: 12, stm: 9, etm: 11 }],
    ["r U R' U' r' F R F'", { htm: 8, qtm: 8, stm: 8, etm: 8 }],
    ["Rw2 S' y E", { htm: 5, qtm: 6, stm: 3, etm: 4 }],
    ['', { htm: 0, qtm: 0, stm: 0, etm: 0 }],
  ])('%s', (text, counts) => {
    expect(moveCounts(text)).toEqual(counts);
  });

  it('is what the cubing library counts, where it counts', () => {
    const random = seeded(51);
    for (let run = 0; run < 200; run++) {
      const text = anyTurns(random, 20);
      const by = (metric: Metric) => countedBy(cube3x3x3, metric, new Alg(text));
      expect(moveCounts(text), text).toEqual({
        htm: by(Metric.OuterBlockTurnMetric),
        qtm: by(Metric.OuterBlockQuantumTurnMetric),
        stm: by(Metric.RangeBlockTurnMetric),
        etm: by(Metric.ExecutionTurnMetric),
      });
    }
  });

  it('is refused for what cannot be read', () => {
    expect(() => moveCounts('R Q')).toThrow(/Character 3/u);
  });
});
