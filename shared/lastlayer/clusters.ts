/**
 * Fixed clusters: a set of more than 24 cases is partitioned once into clusters of 6 to 12 cases that look
 * alike, so that a showing can offer the names of one cluster and tell nothing more. Mirror cases share a
 * cluster. Everything is deterministic: the same definition gives the same clusters for ever.
 */
import { mirror } from './action.ts';
import { seenThrough } from './aspects.ts';
import { type Classes, classify } from './classes.ts';
import type { CaseSetDefinition } from './sets.ts';
import { leastApart, viewCodes } from './view-distance.ts';

/** Up to this many cases, the skip not counted, a set offers every name. */
export const OFFERED_WHOLE = 24;
const SMALLEST = 6;
const WISHED = 8;
const LARGEST = 12;
/** Beyond this many cases only those of one orientation are compared; they are the ones that look alike. */
const COMPARED_WHOLE = 600;
const ROUNDS_OF_SWAPS = 20;

/** Cases that must stay together: a case and its mirror. */
type Unit = readonly number[];

/** Mean distance between the cases of two units, for every pair of units. */
function unitDistances(
  units: readonly Unit[],
  distance: (one: number, other: number) => number,
): Float64Array[] {
  const matrix = units.map(() => new Float64Array(units.length));
  for (let a = 0; a < units.length; a++)
    for (let b = a + 1; b < units.length; b++) {
      let sum = 0;
      for (const one of units[a]!) for (const other of units[b]!) sum += distance(one, other);
      const mean = sum / (units[a]!.length * units[b]!.length);
      matrix[a]![b] = mean;
      matrix[b]![a] = mean;
    }
  return matrix;
}

/** Clusters of nearly equal size, each grown by nearness from the loneliest unit left. */
function grow(units: readonly Unit[], apart: readonly Float64Array[]): number[][] {
  const left = new Set(units.keys());
  let cases = units.reduce((sum, unit) => sum + unit.length, 0);
  const clusters: number[][] = [];
  for (let open = Math.max(1, Math.round(cases / WISHED)); open > 0; open--) {
    const target = Math.ceil(cases / open);
    const cluster: number[] = [];
    const toCluster = new Map<number, number>();
    for (const unit of left) {
      let sum = 0;
      for (const other of left) sum += apart[unit]![other]!;
      toCluster.set(unit, -sum);
    }
    let size = 0;
    for (;;) {
      let best = -1;
      for (const unit of left) {
        if (open > 1 && size + units[unit]!.length > target) continue;
        if (best < 0 || toCluster.get(unit)! < toCluster.get(best)!) best = unit;
      }
      if (best < 0) break;
      if (cluster.length === 0) for (const unit of left) toCluster.set(unit, 0);
      cluster.push(best);
      left.delete(best);
      size += units[best]!.length;
      for (const unit of left) toCluster.set(unit, toCluster.get(unit)! + apart[unit]![best]!);
    }
    cases -= size;
    clusters.push(cluster);
  }
  return clusters;
}

/** Swaps units of equal size between clusters for as long as that brings alike ones together. */
function improve(units: readonly Unit[], apart: readonly Float64Array[], clusters: number[][]): void {
  const home = new Int32Array(units.length);
  clusters.forEach((cluster, number) => {
    for (const unit of cluster) home[unit] = number;
  });
  const pull = (unit: number, cluster: number, without: number): number => {
    let sum = 0;
    for (const other of clusters[cluster]!)
      if (other !== unit && other !== without) sum += apart[unit]![other]! * units[other]!.length;
    return sum * units[unit]!.length;
  };
  for (let round = 0; round < ROUNDS_OF_SWAPS; round++) {
    let swapped = false;
    for (let a = 0; a < units.length; a++)
      for (let b = a + 1; b < units.length; b++) {
        const [ha, hb] = [home[a]!, home[b]!];
        if (ha === hb || units[a]!.length !== units[b]!.length) continue;
        const now = pull(a, ha, a) + pull(b, hb, b);
        const then = pull(a, hb, b) + pull(b, ha, a);
        if (then > now - 1e-9) continue;
        clusters[ha]![clusters[ha]!.indexOf(a)] = b;
        clusters[hb]![clusters[hb]!.indexOf(b)] = a;
        home[a] = hb;
        home[b] = ha;
        swapped = true;
      }
    if (!swapped) break;
  }
}

/** Cases to be compared with each other: all of them, or those that share an orientation up to mirror. */
function comparable(classes: Classes): number[][] {
  const cases = [...classes.canonical.keys()].slice(1);
  if (cases.length <= COMPARED_WHOLE) return [cases];
  const orientation = classify('any', ['co', 'eo']);
  const groups = new Map<number, number[]>();
  for (const at of cases) {
    const state = classes.canonical[at]!;
    const of = Math.min(orientation.caseOf[state]!, orientation.caseOf[mirror(state)]!);
    const group = groups.get(of);
    if (group) group.push(at);
    else groups.set(of, [at]);
  }
  const merged: number[][] = [];
  for (const group of groups.values()) {
    const last = merged.at(-1);
    if (last && (group.length < SMALLEST || last.length < SMALLEST)) last.push(...group);
    else merged.push(group);
  }
  return merged;
}

/** The cluster, from 1, of every case in canonical order, the skip first; all 0 for a set offered whole. */
export function clustersOf(set: CaseSetDefinition, classes: Classes): Int16Array {
  const numbers = new Int16Array(classes.canonical.length);
  if (classes.canonical.length - 1 <= OFFERED_WHOLE) return numbers;
  const codes = viewCodes(seenThrough(set.entry, set.toldApart), classes.canonical, 'right');
  const distance = (one: number, other: number) => leastApart(codes, one, other);
  const mirrorOf = (at: number) => {
    const found = classes.caseOf[mirror(classes.canonical[at]!)]!;
    // A choice of cases may leave the mirror out.
    return found < 0 ? at : found;
  };

  const clusters: number[][] = [];
  for (const cases of comparable(classes)) {
    const units = cases.filter((at) => at <= mirrorOf(at)).map((at) => [...new Set([at, mirrorOf(at)])]);
    const apart = unitDistances(units, distance);
    const grown = grow(units, apart);
    improve(units, apart, grown);
    for (const cluster of grown) clusters.push(cluster.flatMap((unit) => units[unit]!));
  }
  clusters.sort((one, other) => Math.min(...one) - Math.min(...other));
  clusters.forEach((cluster, number) => {
    for (const at of cluster) numbers[at] = number + 1;
  });

  const toSkip = (cluster: readonly number[]) =>
    cluster.reduce((sum, at) => sum + distance(0, at), 0) / cluster.length;
  const nearest = clusters
    .filter((cluster) => cluster.length < LARGEST)
    .reduce((best, cluster) => (toSkip(cluster) < toSkip(best) ? cluster : best));
  numbers[0] = numbers[nearest[0]!]!;
  return numbers;
}
