import type { Area, AreaRoute } from '#renderer/area.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { intakeText } from '#shared/text/intake.ts';
import { pictureSettingsText } from '#shared/text/picture-settings.ts';
import { AdminFrame } from './admin-frame.tsx';
import { DraftPage } from './intake/draft-page.tsx';
import { IntakePage } from './intake/intake-page.tsx';
import { PicturesPage } from './pictures/pictures-page.tsx';

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
    path: '/admin/pictures',
    title: pictureSettingsText.title,
    Page: PicturesPage,
    calls: () => [],
  },
];

/** The administrator's screens. */
export const adminArea: Area = { Frame: AdminFrame, routes };
