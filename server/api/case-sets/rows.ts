import {
  aliasView,
  caseChoices,
  caseOfSetInput,
  definedSet,
  defineSetInput,
  previewSetInput,
  setAliasInput,
  setKeyInput,
  setPreview,
} from '#shared/contracts/case-sets.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { clearAlias, setAlias } from '../../services/aliases/change-alias.ts';
import { defineSet } from '../../services/case-sets/define-set.ts';
import { previewSet } from '../../services/case-sets/preview-set.ts';
import { retireSet } from '../../services/case-sets/retire-set.ts';
import { showChoices } from '../../services/case-sets/show-choices.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** Sets that clubs and administrators define, and what clubs call cases. */
export const caseSetRows = {
  previewSet: defineRow({
    endpoint: endpoints.previewSet,
    who: 'definer',
    input: previewSetInput,
    output: setPreview,
    service: previewSet,
  }),
  defineSet: defineRow({
    endpoint: endpoints.defineSet,
    who: 'definer',
    input: defineSetInput,
    output: definedSet,
    service: defineSet,
  }),
  caseChoices: defineRow({
    endpoint: endpoints.caseChoices,
    who: 'definer',
    input: setKeyInput,
    output: caseChoices,
    service: showChoices,
  }),
  retireSet: defineRow({
    endpoint: endpoints.retireSet,
    who: 'definer',
    input: setKeyInput,
    output: nothing,
    service: retireSet,
  }),
  setAlias: defineRow({
    endpoint: endpoints.setAlias,
    who: 'captain',
    input: setAliasInput,
    output: aliasView,
    service: setAlias,
  }),
  clearAlias: defineRow({
    endpoint: endpoints.clearAlias,
    who: 'captain',
    input: caseOfSetInput,
    output: aliasView,
    service: clearAlias,
  }),
};
