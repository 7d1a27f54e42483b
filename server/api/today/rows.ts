import { endpoints } from '#shared/contracts/endpoints.ts';
import { answersInput, answersResult, misTapInput, todayView } from '#shared/contracts/today.ts';
import { readToday } from '../../services/training/read-today.ts';
import { recordAnswers } from '../../services/training/record-answers.ts';
import { reportMisTap } from '../../services/training/report-mis-tap.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** A member's queue and its answers. */
export const todayRows = {
  today: defineRow({
    endpoint: endpoints.today,
    who: 'member',
    input: nothing,
    output: todayView,
    service: readToday,
  }),
  answer: defineRow({
    endpoint: endpoints.answer,
    who: 'member',
    input: answersInput,
    output: answersResult,
    service: recordAnswers,
  }),
  misTap: defineRow({
    endpoint: endpoints.misTap,
    who: 'member',
    input: misTapInput,
    output: todayView,
    service: reportMisTap,
  }),
};
