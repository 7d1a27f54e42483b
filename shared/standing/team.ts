import type { Estimate } from './dealt-recall.ts';

/** Weight of the mean of all members against a team's own: as much as three members. */
export const TEAM_SHRINKAGE = 3;

export interface TeamFigure {
  readonly members: number;
  /** Plain mean of the members' figures. */
  readonly mean: number;
  /** √(Σ SE²)/M. */
  readonly se: number;
  /** (Σ Θ + 3·Θ̄)/(M + 3): what teams are ranked by. */
  readonly shrunk: number;
  /** Standard error of the shrunk figure: that of the mean times M/(M + 3). */
  readonly shrunkSe: number;
}

/**
 * A team's figure: all its members active in the last 30 days, drawn towards the mean of every member on
 * the board so that one strong member is not the strongest team.
 *
 * @param members figures of the active members
 * @param grandMean mean figure of all active members of all teams on the board
 * @throws RangeError for a team without an active member.
 */
export function teamFigure(members: readonly Estimate[], grandMean: number): TeamFigure {
  const count = members.length;
  if (count === 0) throw new RangeError('A team figure needs at least one active member.');
  const sum = members.reduce((total, { theta }) => total + theta, 0);
  const se = Math.sqrt(members.reduce((total, member) => total + member.se ** 2, 0)) / count;
  return {
    members: count,
    mean: sum / count,
    se,
    shrunk: (sum + TEAM_SHRINKAGE * grandMean) / (count + TEAM_SHRINKAGE),
    shrunkSe: (se * count) / (count + TEAM_SHRINKAGE),
  };
}
