import { endpoints } from '#shared/contracts/endpoints.ts';
import {
  clubView,
  formView,
  memberSettings,
  myCaseInput,
  myCasesView,
  myCaseView,
} from '#shared/contracts/member.ts';
import { readMyCase } from '../../services/cases/read-my-case.ts';
import { readMyCases } from '../../services/cases/read-my-cases.ts';
import { changeSettings } from '../../services/club/change-settings.ts';
import { readClub } from '../../services/club/read-club.ts';
import { readForm } from '../../services/form/read-form.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** A member's cases, form, club and settings. */
export const memberRows = {
  myCases: defineRow({
    endpoint: endpoints.myCases,
    who: 'member',
    input: nothing,
    output: myCasesView,
    service: readMyCases,
  }),
  myCase: defineRow({
    endpoint: endpoints.myCase,
    who: 'member',
    input: myCaseInput,
    output: myCaseView,
    service: readMyCase,
  }),
  form: defineRow({
    endpoint: endpoints.form,
    who: 'member',
    input: nothing,
    output: formView,
    service: readForm,
  }),
  club: defineRow({
    endpoint: endpoints.club,
    who: 'member',
    input: nothing,
    output: clubView,
    service: readClub,
  }),
  changeSettings: defineRow({
    endpoint: endpoints.changeSettings,
    who: 'member',
    input: memberSettings,
    output: memberSettings,
    service: changeSettings,
  }),
};
