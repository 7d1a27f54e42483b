import type { StandingsView } from '#shared/contracts/desk.ts';
import { notFound } from '../../http/problem.ts';
import { asCaptain, type Ctx } from '../context.ts';
import { readProgramme } from '../training/read-programme.ts';
import { BOARD_DAYS, boardMembers, buildBoard } from './build-board.ts';
import { readSharedBoards } from './read-shared-boards.ts';

/**
 * One set's leaderboard (the programme's first unless named) and the boards shared with other clubs.
 * @throws Problem not-found for a set that is not on the club's programme.
 */
export async function readStandings(
  ctx: Ctx,
  input: { setKey?: string | undefined },
): Promise<StandingsView> {
  return asCaptain(ctx, async (tx, { clubId, memberId }) => {
    const programme = await readProgramme(tx, clubId);
    const entry =
      input.setKey === undefined ? programme[0] : programme.find((one) => one.setKey === input.setKey);
    if (input.setKey !== undefined && !entry)
      throw notFound('That set is not on the programme of your club.');
    return {
      sets: programme.map(({ setKey, setName }) => ({ setKey, name: setName })),
      board: entry
        ? await buildBoard(tx, { clubId, setKey: entry.setKey, days: BOARD_DAYS, meMemberId: memberId })
        : null,
      notOptedIn: entry
        ? (await boardMembers(tx, clubId, entry)).filter((member) => !member.onBoards).length
        : 0,
      sharedBoards: await readSharedBoards(tx, clubId),
    };
  });
}
