import type { Area, AreaRoute } from '#renderer/area.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import { DeskFrame } from './desk-frame.tsx';
import { MemberPage } from './member/member-page.tsx';
import { ProgrammePage } from './programme/programme-page.tsx';
import { SquadPage, squadInput } from './squad/squad-page.tsx';
import { StandingsPage, standingsInput } from './standings/standings-page.tsx';

const routes: readonly AreaRoute[] = [
  {
    path: '/desk/squad',
    title: deskText.squad.title,
    Page: SquadPage,
    calls: (_params, search) => [call(endpoints.squad, squadInput(search.setKey))],
  },
  {
    path: '/desk/squad/:memberId',
    title: deskText.member.title,
    Page: MemberPage,
    calls: ({ memberId = '' }) => [call(endpoints.memberPage, { memberId })],
  },
  {
    path: '/desk/standings',
    title: deskText.standings.title,
    Page: StandingsPage,
    calls: (_params, search) => [call(endpoints.standings, standingsInput(search.setKey))],
  },
  {
    path: '/desk/programme',
    title: deskText.programme.title,
    Page: ProgrammePage,
    calls: () => [call(endpoints.programme, {})],
  },
];

/** The captain's screens. */
export const deskArea: Area = { Frame: DeskFrame, routes };
