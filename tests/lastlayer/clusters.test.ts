import { describe, expect, it } from 'vitest';
import { gridOf, gridsOf } from '#server/services/training/grid.ts';
import {
  CASE_SETS,
  type CaseOfSet,
  type CaseSet,
  caseSet,
  OFFERED_WHOLE,
  seenThrough,
} from '#shared/lastlayer/index.ts';
import { leastApart, viewCodes } from '#shared/lastlayer/view-distance.ts';
import { seeded } from './support/random.ts';

const large = CASE_SETS.map(({ key }) => caseSet(key)).filter(({ cases }) => cases.length > OFFERED_WHOLE);
const everyCase = (set: CaseSet): readonly CaseOfSet[] => [set.skip, ...set.cases];

function byCluster(set: CaseSet): ReadonlyMap<number, readonly number[]> {
  const clusters = new Map<number, number[]>();
  everyCase(set).forEach(({ cluster }, at) => {
    clusters.set(cluster, [...(clusters.get(cluster) ?? []), at]);
  });
  return clusters;
}

describe('clusters of a set too large to offer every name', () => {
  it.each(large)('$definition.name: of 6 to 12 cases, nearly all of them of eight', (set) => {
    const sizes = Array.from(byCluster(set).values(), ({ length }) => length);
    expect(Math.min(...sizes)).toBeGreaterThanOrEqual(6);
    expect(Math.max(...sizes)).toBeLessThanOrEqual(12);
    const mean = sizes.reduce((sum, size) => sum + size, 0) / sizes.length;
    const spread = Math.sqrt(sizes.reduce((sum, size) => sum + (size - mean) ** 2, 0) / sizes.length);
    expect(spread).toBeLessThan(1);
  });

  it.each(large)('$definition.name: a case and its mirror in one', (set) => {
    for (const one of set.cases) expect(set.mirrorOf(one).cluster).toBe(one.cluster);
  });

  it.each(large)('$definition.name: more alike inside than across', (set) => {
    const all = everyCase(set);
    const seen = seenThrough(set.definition.entry, set.definition.toldApart);
    const codes = viewCodes(
      seen,
      all.map(({ canonical }) => canonical),
      'right',
    );
    const inside: number[] = [];
    for (const members of byCluster(set).values())
      for (const one of members)
        for (const other of members) if (one < other) inside.push(leastApart(codes, one, other));
    const random = seeded(81);
    const across: number[] = [];
    while (across.length < 5000) {
      const [one, other] = [0, 1].map(() => Math.floor(random() * all.length)) as [number, number];
      if (all[one]!.cluster !== all[other]!.cluster) across.push(leastApart(codes, one, other));
    }
    const mean = (list: readonly number[]) => list.reduce((sum, value) => sum + value, 0) / list.length;
    // Stickers of the fifteen in view: the names offered beside a case are at least three quarters of one nearer.
    expect(mean(inside)).toBeLessThan(mean(across) - 0.75);
  });
});

/** The names a showing of each case offers, in the order of their keys on the screen. */
function offersOf(set: CaseSet): (of: CaseOfSet) => string {
  const cases = new Map(
    set.cases.map(({ key, name, group }) => [key, { key, name, group, algorithms: [] }] as const),
  );
  const grids = gridsOf(set, {
    setKey: set.definition.key,
    setName: set.definition.name,
    number: 1,
    publishedAt: new Date(0),
    note: '',
    cases,
  });
  return (of) => (grids[gridOf(of)] ?? []).map(({ label }) => label).join(' ');
}

describe('what the names offered give away', () => {
  it.each(large)('$definition.name: exactly the cluster, by the rule itself', (set) => {
    const offer = offersOf(set);
    const weights = new Map<string, number>();
    for (const one of set.cases) weights.set(offer(one), (weights.get(offer(one)) ?? 0) + one.weight);
    const clusters = new Map<number, number>();
    for (const one of set.cases) clusters.set(one.cluster, (clusters.get(one.cluster) ?? 0) + one.weight);
    for (const one of set.cases) {
      // Bayes' rule for whoever knows which names come with which case: the prior, restricted to the cluster.
      const posterior = one.weight / weights.get(offer(one))!;
      expect(posterior).toBe(one.weight / clusters.get(one.cluster)!);
    }
  });

  it.each(large.filter(({ cases }) => cases.length < 600))(
    '$definition.name: whoever has learnt the rule from 200,000 showings guesses no better than the cluster lets them',
    (set) => {
      const offer = offersOf(set);
      const random = seeded(82);
      const total = set.cases.reduce((sum, { weight }) => sum + weight, 0);
      const bounds: number[] = [];
      set.cases.reduce((sum, { weight }) => {
        bounds.push(sum + weight);
        return sum + weight;
      }, 0);
      const deal = (): CaseOfSet => {
        const at = random() * total;
        let [low, high] = [0, bounds.length - 1];
        while (low < high) {
          const middle = (low + high) >> 1;
          if (at < bounds[middle]!) high = middle;
          else low = middle + 1;
        }
        return set.cases[low]!;
      };
      const met = new Map<string, Map<CaseOfSet, number>>();
      const texts = new Map(set.cases.map((one) => [one, offer(one)]));
      for (let showing = 0; showing < 200_000; showing++) {
        const one = deal();
        const names = texts.get(one)!;
        const counts = met.get(names) ?? new Map<CaseOfSet, number>();
        counts.set(one, (counts.get(one) ?? 0) + 1);
        met.set(names, counts);
      }
      const guess = new Map(
        Array.from(met, ([names, counts]) => [names, [...counts].sort((a, b) => b[1] - a[1])[0]![0]]),
      );
      let right = 0;
      const runs = 50_000;
      for (let showing = 0; showing < runs; showing++) {
        const one = deal();
        if (guess.get(texts.get(one)!) === one) right++;
      }
      const best = new Map<number, number>();
      for (const { cluster, weight } of set.cases)
        best.set(cluster, Math.max(weight, best.get(cluster) ?? 0));
      const chance = Array.from(best.values()).reduce((sum, weight) => sum + weight, 0) / total;
      // Four standard deviations of a share of that many showings.
      expect(right / runs).toBeLessThan(chance + 4 * Math.sqrt((chance * (1 - chance)) / runs));
    },
  );
});
