import type { SquadRow } from '#shared/contracts/desk.ts';
import { dealtFromSums, type Estimate } from '#shared/standing/index.ts';
import { groupBy } from '../group-by.ts';
import type { FigureOf } from '../standing/answered-before.ts';
import { isoDate } from '../standing/local-date.ts';
import { presentFigure } from '../standing/read-figures.ts';
import type { Column } from './squad-columns.ts';
import type { Activity, GroupSums } from './squad-figures.ts';
import type { SquadMember } from './squad-members.ts';

export interface SquadData {
  readonly members: readonly SquadMember[];
  readonly columns: readonly Column[];
  /** Newest rollup rows, and those of the period's start. */
  readonly now: readonly GroupSums[];
  readonly before: readonly GroupSums[];
  readonly activity: readonly Activity[];
  readonly lastTrained: ReadonlyMap<string, number>;
  /** Whether a figure without answers in the period rests on earlier ones. */
  answeredBefore(figure: FigureOf): boolean;
  /** Training days of the period a member has been in the club for, at least 1. */
  daysOf(member: SquadMember): number;
}

/** Unmet counts as recall 0, so a member without any rollup yet stands at 0. */
const NOTHING: Estimate = { theta: 0, se: 0 };

/** The grid: a row for each member, a cell for each column. */
export function squadRows(data: SquadData): SquadRow[] {
  const now = groupBy(data.now, (row) => row.memberId);
  const before = groupBy(data.before, (row) => row.memberId);
  const activity = groupBy(data.activity, (row) => row.memberId);
  return data.members.map((member) => {
    const own = activity.get(member.memberId) ?? [];
    const shown = data.columns.filter(({ entry }) => answersFor(entry, member));
    const last = data.lastTrained.get(member.memberId);
    return {
      memberId: member.memberId,
      nickname: member.nickname,
      role: member.role,
      cells: data.columns.map((column) => {
        if (!answersFor(column.entry, member)) return { figure: null, change: null };
        const here = estimate(now.get(member.memberId) ?? [], column);
        const then = estimate(before.get(member.memberId) ?? [], column);
        return {
          figure: presentFigure(
            here ?? NOTHING,
            answersIn(own, column),
            data.answeredBefore(figureOf(member, column)),
          ),
          change: here && then ? (here.theta - then.theta) * 100 : null,
        };
      }),
      answers: answersOfAny(own, shown),
      lastTrained: last === undefined ? null : isoDate(last),
      minutesPerDay: own.reduce((sum, row) => sum + row.spentMs, 0) / 60_000 / data.daysOf(member),
    };
  });
}

/** The figures of the grid without an answer in the period. */
export function unanswered({
  members,
  columns,
  activity,
}: Pick<SquadData, 'members' | 'columns' | 'activity'>): FigureOf[] {
  const own = groupBy(activity, (row) => row.memberId);
  return members.flatMap((member) =>
    columns
      .filter((column) => answersFor(column.entry, member))
      .filter((column) => answersIn(own.get(member.memberId) ?? [], column) === 0)
      .map((column) => figureOf(member, column)),
  );
}

function figureOf({ memberId }: SquadMember, { entry, group }: Column): FigureOf {
  return { memberId, setKey: entry.setKey, group };
}

function answersFor({ memberIds }: Column['entry'], member: SquadMember): boolean {
  return memberIds === null || memberIds.has(member.memberId);
}

function isIn(row: { setKey: string; group: string }, column: Column): boolean {
  return row.setKey === column.entry.setKey && (column.group === null || row.group === column.group);
}

function estimate(rows: readonly GroupSums[], column: Column): Estimate | null {
  const mine = rows.filter((row) => isIn(row, column));
  // All groups of a member's day stand under the one calibration of the set.
  const information = mine[0]?.information;
  return information === undefined ? null : dealtFromSums(mine, information);
}

function answersIn(activity: readonly Activity[], column: Column): number {
  return activity.reduce((sum, row) => (isIn(row, column) ? sum + row.answers : sum), 0);
}

/** Each answer once, although a group's column and the column of all both hold it. */
function answersOfAny(activity: readonly Activity[], columns: readonly Column[]): number {
  return activity.reduce(
    (sum, row) => (columns.some((column) => isIn(row, column)) ? sum + row.answers : sum),
    0,
  );
}
