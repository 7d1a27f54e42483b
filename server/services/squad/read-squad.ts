import type { SquadView } from '#shared/contracts/desk.ts';
import { localDay } from '#shared/memory/index.ts';
import { notFound } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import { asCaptain, type Ctx } from '../context.ts';
import { answeredBefore } from '../standing/answered-before.ts';
import { dayOf, isoDate } from '../standing/local-date.ts';
import { BOARD_DAYS, buildBoard } from '../standings/build-board.ts';
import { readProgramme } from '../training/read-programme.ts';
import { PERIOD_DAYS, periodAt } from './period.ts';
import { columnsOfGroups, columnsOfSets } from './squad-columns.ts';
import { activitySince, lastTrainedDays, newestSums } from './squad-figures.ts';
import { squadLosses } from './squad-losses.ts';
import { type SquadMember, squadMembers } from './squad-members.ts';
import { squadRows, unanswered } from './squad-rows.ts';

const LOST_SHOWN = 6;

/**
 * The captain's grid of members × sets, or × the groups of one set, with what the squad loses most to and a
 * short board.
 * @throws Problem not-found for a set that is not on the club's programme.
 */
export async function readSquad(ctx: Ctx, input: { setKey?: string | undefined }): Promise<SquadView> {
  return asCaptain(ctx, async (tx, actor) => {
    const { clubId } = actor;
    const programme = await readProgramme(tx, clubId);
    const chosen = programme.find((entry) => entry.setKey === input.setKey);
    if (input.setKey !== undefined && !chosen)
      throw notFound('That set is not on the programme of your club.');
    const columns = chosen
      ? columnsOfGroups(
          chosen,
          await loadCaseSet(tx, chosen.setKey),
          await readEditionContent(tx, chosen.setKey, chosen.edition),
        )
      : columnsOfSets(programme);
    const entries = chosen ? [chosen] : programme;
    const members = await squadMembers(tx, clubId);
    const today = dayOf(ctx, actor);
    const period = periodAt(today);
    const whose = {
      clubId,
      memberIds: members.map((member) => member.memberId),
      setKeys: entries.map((entry) => entry.setKey),
    };
    const now = await newestSums(tx, whose, period.all);
    const activity = await activitySince(tx, whose, period.fromDay);
    const board = entries[0] ?? null;
    return {
      date: isoDate(today),
      sets: programme.map(({ setKey, setName, edition, limitMs }) => ({
        setKey,
        name: setName,
        edition,
        limitMs,
      })),
      setKey: chosen?.setKey ?? null,
      columns: columns.map(({ key, name, dealt }) => ({ key, name, dealt })),
      rows: squadRows({
        members,
        columns,
        now,
        before: await newestSums(tx, whose, period.start),
        activity,
        answeredBefore: await answeredBefore(tx, clubId, unanswered({ members, columns, activity })),
        lastTrained: await lastTrainedDays(tx, whose),
        daysOf: (member) => Math.min(PERIOD_DAYS, Math.max(1, today - joinedDay(member) + 1)),
      }),
      lost: await squadLosses(tx, {
        clubId,
        members,
        entries,
        newest: now,
        today,
        fromDay: period.fromDay,
        count: LOST_SHOWN,
      }),
      board: board
        ? await buildBoard(tx, {
            clubId,
            setKey: board.setKey,
            days: BOARD_DAYS,
            meMemberId: actor.memberId,
          })
        : null,
    };
  });
}

function joinedDay({ joinedAt, timeZone, rolloverHour }: SquadMember): number {
  return localDay(joinedAt.getTime(), timeZone, rolloverHour);
}
