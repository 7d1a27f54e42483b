import type { Area, AreaRoute } from '#renderer/area.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';
import { catalogueSheetText } from '#shared/text/catalogue-sheet.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import { CasePage } from './case/case-page.tsx';
import { CatalogueFrame } from './catalogue-frame.tsx';
import { DefinePage } from './define/define-page.tsx';
import { readDefinition, writeDefinition } from './define/definition.ts';
import { drawnInput, readAddress } from './draw/draw-input.ts';
import { DrawPage } from './draw/draw-page.tsx';
import { EditionPage } from './edition/edition-page.tsx';
import { searchInput } from './search/search-input.ts';
import { setInput } from './set/set-input.ts';
import { SetPage } from './set/set-page.tsx';
import { SetsPage } from './sets/sets-page.tsx';
import { sheetInput } from './sheet/sheet-input.ts';
import { SheetPage } from './sheet/sheet-page.tsx';
import { SubsetPage } from './subset/subset-page.tsx';

// Addresses of one word stand before those with a set's key in that place.
const routes: readonly AreaRoute[] = [
  {
    path: '/catalogue',
    title: catalogueText.sets.title,
    Page: SetsPage,
    calls: (_params, { q }) => {
      const sought = searchInput(q);
      const sets = call(endpoints.catalogue, {});
      return sought ? [sets, call(endpoints.catalogueSearch, sought)] : [sets];
    },
  },
  {
    path: '/catalogue/draw',
    title: drawingText.title,
    Page: DrawPage,
    calls: (_params, _search, query) => [
      call(endpoints.catalogue, {}),
      call(endpoints.catalogueDrawn, drawnInput(readAddress(query))),
    ],
  },
  {
    path: '/catalogue/new',
    title: setMakingText.define.title,
    Page: DefinePage,
    calls: (_params, search) => [call(endpoints.previewSet, writeDefinition(readDefinition(search)))],
  },
  {
    path: '/catalogue/:setKey',
    title: catalogueText.set.title,
    Page: SetPage,
    calls: ({ setKey = '' }, search) => [call(endpoints.catalogueSet, setInput(setKey, search))],
  },
  {
    path: '/catalogue/:setKey/subset',
    title: setMakingText.subset.title,
    Page: SubsetPage,
    calls: ({ setKey = '' }) => [call(endpoints.caseChoices, { setKey })],
  },
  {
    path: '/catalogue/:setKey/sheet',
    title: catalogueSheetText.name,
    Page: SheetPage,
    calls: ({ setKey = '' }, search) => [call(endpoints.catalogueSheet, sheetInput(setKey, search))],
  },
  {
    path: '/catalogue/:setKey/cases/:caseKey',
    title: catalogueCaseText.title,
    Page: CasePage,
    calls: ({ setKey = '', caseKey = '' }) => [
      call(endpoints.catalogueCase, { setKey, caseKey }),
      call(endpoints.catalogueConfusable, { setKey, caseKey }),
    ],
  },
  {
    path: '/catalogue/:setKey/editions/:number',
    title: catalogueText.sets.title,
    Page: EditionPage,
    calls: ({ setKey = '', number = '' }) => [call(endpoints.edition, { setKey, number: Number(number) })],
  },
];

/** The catalogue's screens, for whoever is signed in. */
export const catalogueArea: Area = { Frame: CatalogueFrame, routes };
