import { catalogueView, editionInput, editionView } from '#shared/contracts/catalogue.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { listCatalogue } from '../../services/catalogue/list-catalogue.ts';
import { showEdition } from '../../services/catalogue/show-edition.ts';
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
  edition: defineRow({
    endpoint: endpoints.edition,
    who: 'signed-in',
    input: editionInput,
    output: editionView,
    service: showEdition,
  }),
};
