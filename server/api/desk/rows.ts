import {
  assignSetInput,
  memberPageInput,
  memberPageView,
  programmeView,
  squadInput,
  squadView,
  standingsInput,
  standingsView,
  withdrawSetInput,
} from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { assignSet } from '../../services/programme/assign-set.ts';
import { readProgrammeView } from '../../services/programme/read-programme-view.ts';
import { withdrawSet } from '../../services/programme/withdraw-set.ts';
import { readMemberPage } from '../../services/squad/read-member-page.ts';
import { readSquad } from '../../services/squad/read-squad.ts';
import { readStandings } from '../../services/standings/read-standings.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** The captain's desk. */
export const deskRows = {
  squad: defineRow({
    endpoint: endpoints.squad,
    who: 'captain',
    input: squadInput,
    output: squadView,
    service: readSquad,
  }),
  memberPage: defineRow({
    endpoint: endpoints.memberPage,
    who: 'captain',
    input: memberPageInput,
    output: memberPageView,
    service: readMemberPage,
  }),
  standings: defineRow({
    endpoint: endpoints.standings,
    who: 'captain',
    input: standingsInput,
    output: standingsView,
    service: readStandings,
  }),
  programme: defineRow({
    endpoint: endpoints.programme,
    who: 'captain',
    input: nothing,
    output: programmeView,
    service: readProgrammeView,
  }),
  assignSet: defineRow({
    endpoint: endpoints.assignSet,
    who: 'captain',
    input: assignSetInput,
    output: programmeView,
    service: assignSet,
  }),
  withdrawSet: defineRow({
    endpoint: endpoints.withdrawSet,
    who: 'captain',
    input: withdrawSetInput,
    output: programmeView,
    service: withdrawSet,
  }),
};
