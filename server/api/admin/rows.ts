import { endpoints } from '#shared/contracts/endpoints.ts';
import {
  discardInput,
  draftInput,
  draftView,
  intakeView,
  publishInput,
  publishResult,
  settleLineInput,
  uploadInput,
  uploadResult,
} from '#shared/contracts/intake.ts';
import { discardDraft } from '../../services/intake/discard-draft.ts';
import { listIntake } from '../../services/intake/list-intake.ts';
import { publishDraft } from '../../services/intake/publish-draft.ts';
import { settleLine } from '../../services/intake/settle-line.ts';
import { showDraft } from '../../services/intake/show-draft.ts';
import { uploadCaseFile } from '../../services/intake/upload-case-file.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** The administrator's intake. */
export const adminRows = {
  intake: defineRow({
    endpoint: endpoints.intake,
    who: 'administrator',
    input: nothing,
    output: intakeView,
    service: listIntake,
  }),
  upload: defineRow({
    endpoint: endpoints.upload,
    who: 'administrator',
    input: uploadInput,
    output: uploadResult,
    service: uploadCaseFile,
  }),
  draft: defineRow({
    endpoint: endpoints.draft,
    who: 'administrator',
    input: draftInput,
    output: draftView,
    service: showDraft,
  }),
  settleLine: defineRow({
    endpoint: endpoints.settleLine,
    who: 'administrator',
    input: settleLineInput,
    output: draftView,
    service: settleLine,
  }),
  publish: defineRow({
    endpoint: endpoints.publish,
    who: 'administrator',
    input: publishInput,
    output: publishResult,
    service: publishDraft,
  }),
  discard: defineRow({
    endpoint: endpoints.discard,
    who: 'administrator',
    input: discardInput,
    output: intakeView,
    service: discardDraft,
  }),
};
