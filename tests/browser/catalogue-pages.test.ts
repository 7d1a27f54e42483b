import { describe } from 'vitest';
import { caseSet } from '#shared/lastlayer/index.ts';
import { lookAt, type PageOfOurs } from './support/every-page.ts';
import { useSite } from './support/site.ts';

const site = useSite();

const PAGES: readonly PageOfOurs[] = [
  { name: 'Catalogue', who: 'desk', path: '/catalogue', heading: 'Catalogue' },
  { name: 'Catalogue of a member', who: 'tobi', path: '/catalogue', heading: 'Catalogue' },
  { name: 'a search by name', who: 'tobi', path: '/catalogue?q=T', heading: 'Catalogue' },
  {
    name: 'a search by moves',
    who: 'ines',
    path: `/catalogue?q=${encodeURIComponent("R U R' U R U2 R'")}`,
    heading: 'Catalogue',
  },
  { name: 'a search by what is no move', who: 'desk', path: '/catalogue?q=R+U+Q', heading: 'Catalogue' },
  {
    name: 'a drawing',
    who: 'ines',
    path: '/catalogue/draw?d=----y----rrr---------&sets=pll,zbll',
    heading: 'Find by drawing',
  },
  {
    name: 'a drawing of no cube',
    who: 'tobi',
    path: '/catalogue/draw?d=------oy-rrr---------',
    heading: 'Find by drawing',
  },
  { name: 'a set', who: 'ines', path: '/catalogue/oll?group=dot&sort=-prior', heading: 'OLL' },
  { name: 'a set of thousands', who: 'ines', path: '/catalogue/1lll?angles=1', heading: '1LLL' },
  { name: 'a set in which nothing was found', who: 'desk', path: '/catalogue/pll?q=nothing', heading: 'PLL' },
  { name: 'a case of the catalogue', who: 'ines', path: inCatalogue('pll', 'Ja'), heading: 'PLL Ja' },
  { name: 'a case without inverse', who: 'tobi', path: inCatalogue('oll', '27'), heading: 'OLL 27' },
  { name: 'a case in two looks', who: 'desk', path: inCatalogue('1lll', '#2001'), heading: '1LLL #2001' },
  { name: 'the skip', who: 'ines', path: inCatalogue('pll', 'skip'), heading: 'PLL skip' },
  { name: 'an algorithm sheet', who: 'ines', path: '/catalogue/pll/sheet', heading: 'PLL, algorithm sheet' },
  {
    name: 'a case that is none',
    who: 'ines',
    path: '/catalogue/pll/cases/none',
    heading: 'Not here',
    status: 404,
  },
  { name: 'a new case set', who: 'ines', path: '/catalogue/new', heading: 'New case set' },
  {
    name: 'a mix of entries',
    who: 'desk',
    path: '/catalogue/new?entries=any:3,eo:2&toldApart=co,eo&solved=co,eo',
    heading: 'New case set',
  },
  { name: 'cases to choose', who: 'ines', path: '/catalogue/zbll/subset', heading: 'Cases of ZBLL' },
  { name: 'an edition', who: 'desk', path: '/catalogue/oll/editions/1', heading: 'OLL, edition 1' },
];

/** Address of a case's page in the catalogue. */
function inCatalogue(setKey: string, name: string): string {
  return `/catalogue/${setKey}/cases/${encodeURIComponent(caseSet(setKey).byName(name)?.key ?? '')}`;
}

describe('every page of the Catalogue, light and dark, wide and narrow', () => {
  lookAt(site, PAGES);
});
