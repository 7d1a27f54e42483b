import { catalogueCaseInput } from '#shared/contracts/catalogue-case.ts';
import {
  confusableView,
  drawnInput,
  drawnView,
  searchInput,
  searchView,
} from '#shared/contracts/catalogue-search.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { findDrawn } from '../../services/catalogue/find-drawn.ts';
import { searchCatalogue } from '../../services/catalogue/search-catalogue.ts';
import { showConfusable } from '../../services/catalogue/show-confusable.ts';
import { defineRow } from '../define-row.ts';

/** Finding cases in the catalogue: whoever is signed in may. */
export const catalogueSearchRows = {
  catalogueSearch: defineRow({
    endpoint: endpoints.catalogueSearch,
    who: 'signed-in',
    input: searchInput,
    output: searchView,
    service: searchCatalogue,
  }),
  catalogueDrawn: defineRow({
    endpoint: endpoints.catalogueDrawn,
    who: 'signed-in',
    input: drawnInput,
    output: drawnView,
    service: findDrawn,
  }),
  catalogueConfusable: defineRow({
    endpoint: endpoints.catalogueConfusable,
    who: 'signed-in',
    input: catalogueCaseInput,
    output: confusableView,
    service: showConfusable,
  }),
};
