import type { CaseOfSet, CaseSet } from '#shared/lastlayer/index.ts';
import { type CaseMemory, recall } from '#shared/memory/index.ts';
import { calibrated } from '#shared/standing/index.ts';
import type { EditionContent } from '../catalogue/read-edition.ts';

/** A member who answers for the set: their memory of its cases, and the calibration they stand under. */
export interface Answering {
  readonly nickname: string;
  readonly memory: ReadonlyMap<string, CaseMemory>;
  /** Shift b on the logit scale. */
  readonly shift: number;
  /** The training day the figures are of: recall is reckoned at its end, as in the rollups. */
  readonly day: number;
}

export interface Loss {
  readonly set: CaseSet;
  readonly content: EditionContent;
  readonly case: CaseOfSet;
  /** Prior × (1 − recall), the mean over those who answer for the set; unmet counts as recall 0. */
  readonly share: number;
  /** The part of `share` that comes from members who have not met the case. */
  readonly unmetShare: number;
  /** Who has not met it, by nickname. */
  readonly unmet: readonly string[];
  readonly members: number;
}

/**
 * What the squad loses to each case of a set, the skip left out. The shares of a set add up to
 * (1 − mean dealt recall) × (1 − share of skips).
 */
export function lossesOf(set: CaseSet, content: EditionContent, squad: readonly Answering[]): Loss[] {
  if (squad.length === 0) return [];
  return [...content.cases.keys()].flatMap((key) => {
    const c = set.byKey(key);
    if (!c || c.skip) return [];
    const prior = c.weight / set.total;
    let lost = 0;
    const unmet: string[] = [];
    for (const { nickname, memory, shift, day } of squad) {
      const own = memory.get(key);
      if (own) lost += 1 - calibrated(recall(own, day + 1), shift);
      else unmet.push(nickname);
    }
    const of = squad.length;
    const share = (prior * (lost + unmet.length)) / of;
    return [{ set, content, case: c, share, unmetShare: (prior * unmet.length) / of, unmet, members: of }];
  });
}

/** The costliest cases over all sets, largest share first. */
export function costliest(losses: readonly Loss[], count: number): Loss[] {
  return losses
    .filter(({ share }) => share > 0)
    .sort((a, b) => b.share - a.share || a.case.number - b.case.number)
    .slice(0, count);
}
