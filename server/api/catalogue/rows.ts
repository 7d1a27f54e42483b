import {
  catalogueCasesInput,
  catalogueCasesView,
  catalogueSetInput,
  catalogueSetView,
  catalogueView,
  editionInput,
  editionView,
} from '#shared/contracts/catalogue.ts';
import { catalogueCaseInput, catalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { catalogueSheetInput, catalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { listCases } from '../../services/catalogue/list-cases.ts';
import { listCatalogue } from '../../services/catalogue/list-catalogue.ts';
import { showCase } from '../../services/catalogue/show-case.ts';
import { showEdition } from '../../services/catalogue/show-edition.ts';
import { showSet } from '../../services/catalogue/show-set.ts';
import { showSheet } from '../../services/catalogue/show-sheet.ts';
import { defineRow } from '../define-row.ts';
import { nothing } from '../session/rows.ts';

/** The catalogue: whoever is signed in may read it. */
export const catalogueRows = {
  catalogue: defineRow({
    endpoint: endpoints.catalogue,
    who: 'signed-in',
    input: nothing,
    output: catalogueView,
    service: listCatalogue,
  }),
  catalogueSet: defineRow({
    endpoint: endpoints.catalogueSet,
    who: 'signed-in',
    input: catalogueSetInput,
    output: catalogueSetView,
    service: showSet,
  }),
  catalogueCases: defineRow({
    endpoint: endpoints.catalogueCases,
    who: 'signed-in',
    input: catalogueCasesInput,
    output: catalogueCasesView,
    service: listCases,
  }),
  catalogueCase: defineRow({
    endpoint: endpoints.catalogueCase,
    who: 'signed-in',
    input: catalogueCaseInput,
    output: catalogueCaseView,
    service: showCase,
  }),
  catalogueSheet: defineRow({
    endpoint: endpoints.catalogueSheet,
    who: 'signed-in',
    input: catalogueSheetInput,
    output: catalogueSheetView,
    service: showSheet,
  }),
  edition: defineRow({
    endpoint: endpoints.edition,
    who: 'signed-in',
    input: editionInput,
    output: editionView,
    service: showEdition,
  }),
};
