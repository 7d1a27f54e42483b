import type { MemberPageView } from '#shared/contracts/desk.ts';
import { interval } from '#shared/standing/index.ts';
import { asCaptain, type Ctx } from '../context.ts';
import { answeredBefore } from '../standing/answered-before.ts';
import { isoDate } from '../standing/local-date.ts';
import { type DayFigure, dayFigures, latestFigures, presentFigure } from '../standing/read-figures.ts';
import { dayOfMember } from './day-of-member.ts';
import { latestAnswers } from './latest-answers.ts';
import { memberCases } from './member-cases.ts';
import { periodAt } from './period.ts';
import { lastTrainedDays } from './squad-figures.ts';

const TREND_DAYS = 90;
const LATEST = 30;

/**
 * One member as their captain sees them: where each set stands and how it came there, what is weakest, what
 * was answered last.
 * @throws Problem not-found for somebody who is not in the captain's club.
 */
export async function readMemberPage(ctx: Ctx, { memberId }: { memberId: string }): Promise<MemberPageView> {
  return asCaptain(ctx, async (tx, captain) => {
    const day = await dayOfMember(ctx, tx, captain, memberId);
    const { clubId } = captain;
    const { fromDay } = periodAt(day.day);
    const days = await dayFigures(tx, {
      clubId,
      memberId,
      fromDay: day.day - TREND_DAYS + 1,
      toDay: day.day,
    });
    const lately = days.filter((one) => one.day >= fromDay);
    const newest = await latestFigures(tx, { clubId, memberId });
    const before = await answeredBefore(
      tx,
      clubId,
      day.sets.map(({ entry }) => ({ memberId, setKey: entry.setKey, group: null })),
    );
    const last = (await lastTrainedDays(tx, { clubId, memberIds: [memberId] })).get(memberId);
    return {
      date: isoDate(day.day),
      timeZone: captain.timeZone,
      memberId,
      nickname: day.member.nickname,
      role: day.member.role,
      lastTrained: last === undefined ? null : isoDate(last),
      sets: day.sets.map(({ entry }) => {
        const ofSet = (one: DayFigure) => one.setKey === entry.setKey;
        const now = newest.find(ofSet) ?? { theta: 0, se: 0 };
        return {
          setKey: entry.setKey,
          name: entry.setName,
          edition: entry.edition,
          now: presentFigure(
            now,
            total(lately.filter(ofSet), (one) => one.answers),
            before({ memberId, setKey: entry.setKey, group: null }),
          ),
          days: days.filter(ofSet).map(presentDay),
        };
      }),
      cases: await memberCases(tx, day),
      lately: await latestAnswers(tx, day, LATEST),
      rates: {
        answers: total(lately, (one) => one.answers),
        held: total(lately, (one) => one.held),
        late: total(lately, (one) => one.late),
        missed: total(lately, (one) => one.missed),
        left: total(lately, (one) => one.left),
        misTaps: total(lately, (one) => one.misTaps),
      },
    };
  });
}

function presentDay({ day, theta, se, answers }: DayFigure): MemberPageView['sets'][number]['days'][number] {
  const [low, high] = interval(theta, se);
  return { date: isoDate(day), value: theta, low, high, answers };
}

function total(days: readonly DayFigure[], of: (day: DayFigure) => number): number {
  return days.reduce((sum, day) => sum + of(day), 0);
}
