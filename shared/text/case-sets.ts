import { numberText } from './numbers.ts';

const { count } = numberText;

/** `A`, `A and B`, `A, B and C`. */
const list = (words: readonly string[]): string =>
  words.length < 2 ? words.join() : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;

/** What stands in the way of a set, a subset, an alias. */
const problems = {
  whoDefines: 'Only a captain or an administrator can do this.',
  thisSet: 'This set',
  taken: (name: string) => `There is a set called “${name}” already.`,
  tooMany: (most: number) => `A club can have ${most} sets of its own. Retire one first.`,
  sameSet: (name: string) => `“${name}” is this very set already.`,
  allOf: (name: string) => `These are all cases of “${name}”: assign that set itself.`,
  noCase: (name: string, key: string) => `The set “${name}” has no case ${key}.`,
  tradeStays: 'It is one of the trade’s own sets and stays.',
  notYours: 'It belongs to all clubs: only an administrator can retire it.',
  retiredAlready: 'It is retired already.',
  onYourProgramme: 'It is on your programme: withdraw it there first.',
  onProgrammes: (clubs: number) =>
    `It is on the programme of ${count(clubs, 'club', 'clubs')}: it has to be withdrawn there first.`,
  hasEditions: 'It has editions: what is published stays.',
  hasSubsets: (of: readonly string[]) =>
    `${of.length === 1 ? 'A set is' : 'Sets are'} made of it: ${list(of.map((name) => `“${name}”`))}. Retire ${of.length === 1 ? 'it' : 'them'} first.`,
  onBoard: 'It is on a board that clubs share.',
  skipHasNone: 'The skip has no name to be changed.',
  nameOfOther: (alias: string, name: string) => `“${alias}” is how ${name} is called already.`,
  ownName: (alias: string) => `The case is called “${alias}” already.`,
} as const;

export const caseSetText = { problems } as const;
