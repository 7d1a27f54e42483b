import { numberText } from './numbers.ts';

/** Words of the algorithm sheet. */
export const catalogueSheetText = {
  name: 'Algorithm sheet',
  title: (set: string) => `${set}, algorithm sheet`,
  back: (set: string) => `All of ${set}`,
  edition: (number: number) => `Edition ${number}`,
  cases: (n: number) => numberText.count(n, 'case', 'cases'),
  holding: 'Each case as its first algorithm takes it; the notch is the front.',
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
