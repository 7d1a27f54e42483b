import type { Area, AreaRoute } from '#renderer/area.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { adminText } from '#shared/text/admin.ts';
import { intakeText } from '#shared/text/intake.ts';
import { AdminFrame } from './admin-frame.tsx';
import { CataloguePage } from './catalogue/catalogue-page.tsx';
import { EditionPage } from './catalogue/edition-page.tsx';
import { DraftPage } from './intake/draft-page.tsx';
import { IntakePage } from './intake/intake-page.tsx';

const intake: Omit<AreaRoute, 'path'> = {
  title: intakeText.list.title,
  Page: IntakePage,
  calls: () => [call(endpoints.intake, {})],
};

const routes: readonly AreaRoute[] = [
  { path: '/admin', ...intake },
  { path: '/admin/intake', ...intake },
  {
    path: '/admin/intake/:draftId',
    title: intakeText.list.title,
    Page: DraftPage,
    calls: ({ draftId = '' }) => [call(endpoints.draft, { draftId })],
  },
  {
    path: '/admin/catalogue',
    title: adminText.catalogue.title,
    Page: CataloguePage,
    calls: () => [call(endpoints.catalogue, {})],
  },
  {
    path: '/admin/catalogue/:setKey/:number',
    title: adminText.catalogue.title,
    Page: EditionPage,
    calls: ({ setKey = '', number = '' }) => [call(endpoints.edition, { setKey, number: Number(number) })],
  },
];

/** The administrator's screens. */
export const adminArea: Area = { Frame: AdminFrame, routes };
