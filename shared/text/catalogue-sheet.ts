import { aufText } from './auf.ts';
import { numberText } from './numbers.ts';

/** Words of the algorithm sheet. */
export const catalogueSheetText = {
  name: 'Algorithm sheet',
  title: (set: string) => `${set}, algorithm sheet`,
  back: (set: string) => `All of ${set}`,
  edition: (number: number) => `Edition ${number}`,
  cases: (n: number) => numberText.count(n, 'case', 'cases'),
  holding:
    'Each case as its first algorithm takes it; the notch is the front. A turn set apart before an algorithm is the AUF it needs from there.',
  /** An AUF before an algorithm, as it stands on the sheet and as it is read aloud. */
  auf: aufText.name,
  aufSpoken: (turns: number) => `AUF ${aufText.spoken(turns)}, then`,
  /** Repeated at the head of every page on paper. */
  running: (set: string, edition: number) => `${set}, edition ${edition}`,
  choices: {
    group: 'Group',
    allGroups: 'all groups',
    algorithms: 'Algorithms',
    all: 'all',
    first: 'the first of each',
    shades: 'Pictures',
    greys: 'greys with letters',
    colours: 'colours with letters',
    print: 'Print',
    show: 'Show',
  },
} as const;
