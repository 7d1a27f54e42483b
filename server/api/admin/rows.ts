import { endpoints } from '#shared/contracts/endpoints.ts';
import {
  catalogueView,
  discardInput,
  draftInput,
  draftView,
  editionInput,
  editionView,
  intakeView,
  publishInput,
  publishResult,
  settleLineInput,
  uploadInput,
  uploadResult,
} from '#shared/contracts/intake.ts';
import { listCatalogue } from '../../services/catalogue/list-catalogue.ts';
import { showEdition } from '../../services/catalogue/show-edition.ts';
import { discardDraft } from '../../services/intake/discard-draft.ts';
import { listIntake } from '../../services/intake/list-intake.ts';
import { publishDraft } from '../../services/intake/publish-draft.ts';
import { settleLine } from '../../services/intake/settle-line.ts';
import { showDraft } from '../../services/intake/show-draft.ts';
import { uploadCaseFile } from '../../services/intake/upload-case-file.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** The administrator's places: intake and catalogue. */
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
  catalogue: defineRow({
    endpoint: endpoints.catalogue,
    who: 'administrator',
    input: nothing,
    output: catalogueView,
    service: listCatalogue,
  }),
  edition: defineRow({
    endpoint: endpoints.edition,
    who: 'administrator',
    input: editionInput,
    output: editionView,
    service: showEdition,
  }),
};
