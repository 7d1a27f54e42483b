import type { Area, AreaRoute } from '#renderer/area.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { memberText } from '#shared/text/member.ts';
import { todayText } from '#shared/text/today.ts';
import { CasePage } from './cases/case-page.tsx';
import { CasesPage } from './cases/cases-page.tsx';
import { ClubPage } from './club/club-page.tsx';
import { FormPage } from './form/form-page.tsx';
import { MemberFrame } from './member-frame.tsx';
import { TodayPage } from './today/today-page.tsx';

const routes: readonly AreaRoute[] = [
  {
    path: '/today',
    title: todayText.title,
    Page: TodayPage,
    calls: () => [call(endpoints.today, {})],
  },
  {
    path: '/cases',
    title: memberText.cases.title,
    Page: CasesPage,
    calls: () => [call(endpoints.myCases, {})],
  },
  {
    path: '/cases/:key',
    title: memberText.case.title,
    Page: CasePage,
    calls: ({ key = '' }) => [call(endpoints.myCase, { key })],
  },
  {
    path: '/form',
    title: memberText.form.title,
    Page: FormPage,
    calls: () => [call(endpoints.form, {})],
  },
  {
    path: '/club',
    title: memberText.club.title,
    Page: ClubPage,
    calls: () => [call(endpoints.club, {})],
  },
];

/** The member's screens: phone first. */
export const memberArea: Area = { Frame: MemberFrame, routes };
