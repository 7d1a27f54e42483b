import type { Figure } from '../contracts/common.ts';

const percent = (share: number): string => `${Math.round(share * 100)}%`;
const plural = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

const states = { unmet: 'unmet', settling: 'settling', holding: 'holding', slipping: 'slipping' } as const;
const outcomes = { held: 'held', late: 'late', missed: 'missed', left: 'left' } as const;
/** What was done where no case was named. */
const otherNames: Readonly<Record<string, string>> = {
  solved: 'named solved',
  lost: 'recognised, then lost',
  unrecognised: 'not recognised',
  left: '–',
};

/** A prior as a fraction in lowest terms whose numerator is 1 where it can be. */
function oneIn(weight: number, total: number): string {
  const share = total / weight;
  return Number.isInteger(share) ? `1 in ${share}` : `1 in ${share.toFixed(1)}`;
}

/** Words of My cases, the case page, Form and Club. */
export const memberText = {
  percent,
  states,
  outcomes,
  prior: oneIn,
  priorExact: (weight: number, total: number) => `${weight}/${total.toLocaleString('en-GB')}`,
  notBegun: 'not begun',
  figure: ({ value, rests }: Figure) => (rests === 'nothing' ? '–' : percent(value)),
  figureLabel: ({ value, low, high, answers, rests }: Figure) =>
    rests === 'nothing'
      ? 'not begun'
      : `${percent(value)}, between ${percent(low)} and ${percent(high)}, from ${rests === 'elsewhere' ? 'answers in another set' : plural(answers, 'answer', 'answers')}`,
  teamLabel: (value: number, low: number, high: number) =>
    `${percent(value)}, between ${percent(low)} and ${percent(high)}`,
  answers: (count: number) => plural(count, 'answer', 'answers'),
  loading: 'Loading.',
  couldNotLoad: 'This could not be loaded.',
  tryAgain: 'Try again',
  noSets: {
    title: 'Nothing is on your programme yet',
    detail: 'Your captain chooses the case sets. When one is handed to you, it shows here.',
  },
  today: 'today',
  tomorrow: 'tomorrow',
  none: '–',

  cases: {
    title: 'My cases',
    count: (shown: number, all: number) =>
      shown === all ? plural(all, 'case', 'cases') : `${shown} of ${all}`,
    set: 'Set',
    allSets: 'all sets',
    state: 'State',
    allStates: 'all states',
    search: 'Find',
    searchHint: 'name, group or moves',
    sort: 'Order',
    sorts: {
      prior: 'most often dealt',
      name: 'name',
      recall: 'lowest recall',
      next: 'next showing',
      state: 'state',
    },
    columns: {
      picture: 'Picture',
      name: 'Case',
      group: 'Group',
      algorithm: 'Algorithm',
      prior: 'Prior',
      state: 'State',
      recall: 'Recall now',
      next: 'Next showing',
    },
    recallNow: (share: number) => `${percent(share)} now`,
    next: (when: string) => `next ${when}`,
    caption: 'Cases you answer for',
    none: 'No case fits. Take a filter away.',
    clear: 'Show all',
    setRecall: 'dealt recall',
    toCatalogue: 'Catalogue: all cases and algorithms',
  },

  case: {
    title: 'Case',
    back: 'My cases',
    inCatalogue: 'In the catalogue',
    tradeName: 'also called',
    angles: 'Angles',
    anglesNote: (count: number) =>
      count === 1
        ? 'It looks the same from every side, up to the AUF.'
        : `It has ${count} really different angles, up to the AUF.`,
    angle: (auf: string) => `AUF before: ${auf}`,
    algorithms: 'Algorithms',
    mirror: 'Mirror partner',
    mirrorSelf: 'It is its own mirror image, or its mirror partner is not in this edition.',
    prior: 'prior',
    recall: 'recall now',
    next: 'next showing',
    group: 'group',
    latest: 'Latest answers',
    latestCaption: 'Answers to this case, newest first',
    noAnswers: 'Not shown to you yet.',
    columns: { when: 'When', outcome: 'Outcome', time: 'Time', lostBy: 'Lost by' },
    as: (named: string) => otherNames[named] ?? `named ${named}`,
    notScored: 'not scored',
    misTap: 'mis-tap',
    seconds: (ms: number) => `${(ms / 1000).toFixed(2)} s`,
    missing: 'There is no such case on your programme.',
  },

  form: {
    title: 'Form',
    recall: 'Dealt recall',
    recallNote:
      'The chance that the next case a solve deals you is held. The bar is where it lies with 90 % certainty; it is hollow where it rests on few answers.',
    chart: (name: string) => `${name}: dealt recall by day`,
    head: ['Day', 'Dealt recall', 'Low', 'High', 'Answers'],
    noDays: 'No day has been reckoned yet. It begins with the first answer.',
    states: 'States',
    outcomes: 'Outcomes of 28 days',
    misTaps: 'mis-taps',
    noOutcomes: 'No answers in the last 28 days.',
    minutes: 'Minutes a day',
    minutesChart: 'Minutes of training by day, the last 28 days',
    minutesHead: ['Day', 'Minutes'],
    minutesTotal: (minutes: number, days: number) =>
      `${Math.round(minutes)} min on ${plural(days, 'day', 'days')} of the last 28`,
    minutesTick: (minutes: number) => `${minutes} min`,
    edition: (number: number) => `edition ${number}`,
  },

  club: {
    title: 'Club',
    boards: 'Boards',
    boardsNote: (days: number) =>
      `Dealt recall, mean of the last ${days} days, ranked by the low end of its interval. Only members who chose to be shown.`,
    boardCaption: (name: string, edition: number, limit: number) =>
      `${name}, edition ${edition}, limit ${limit} s`,
    noBoards: 'There is no board yet: no set is on the programme.',
    nobodyRanked: 'Nobody is on this board yet.',
    unranked: 'Under 20 answers: listed, not ranked.',
    rank: 'Rank',
    member: 'Member',
    recall: 'Dealt recall',
    you: 'you',
    shared: 'Between clubs',
    sharedNote: 'Team figures only; no person is named to another club.',
    club: 'Club',
    members: 'Members',
    noShared: 'The club is on no shared board.',
    sharedEmpty: 'No club has published a figure yet.',
    people: 'People',
    peopleNote:
      'Nicknames only. Many members are under 16: no full names, birthdays, photos or addresses are kept on these pages. Do not use a full name as a nickname.',
    roles: { member: 'member', captain: 'captain' },
    settings: 'My settings',
    also: 'Also here',
    alsoNote: {
      catalogue: 'Every case set, with its algorithms.',
      ledger: 'What a solve can deal, counted.',
    },
    minutes: 'Minutes a day',
    minutesHint: 'From 1 to 120. The queue is cut to fit.',
    minutesError: 'Type a whole number from 1 to 120.',
    onBoards: 'Boards',
    onBoardsLabel: 'Show me on the club’s boards',
    onBoardsHint:
      'Everyone in the club then sees your nickname, your dealt recall of each set with its interval, and your number of answers. Nobody sees single answers there. Turn it off and you are gone from the boards at once.',
    holding: 'Holding',
    holdings: {
      right: { label: 'I see the right side', hint: 'Pictures show top, front and right.' },
      left: { label: 'I see the left side', hint: 'Pictures show top, front and left.' },
    },
    cross: 'Cross colours',
    crossHint: 'Pictures come with the opposite colour on top.',
    crosses: {
      white: 'white',
      yellow: 'yellow',
      green: 'green',
      blue: 'blue',
      orange: 'orange',
      red: 'red',
      'white+yellow': 'white and yellow',
      'green+blue': 'green and blue',
      'orange+red': 'orange and red',
      all: 'colour neutral',
    },
    save: 'Save settings',
    saving: 'Saving',
    saved: 'Saved. It holds from the next showing that is issued.',
    notSaved: 'Not saved.',
    account: 'Account',
    signedInAs: (nickname: string, club: string) => `${nickname}, ${club}`,
    switchTo: 'Switch club',
    switchKey: (club: string, role: string) => `${club} (${role})`,
    toDesk: 'To the captain’s desk',
    unsent: (count: number) =>
      `${plural(count, 'answer has', 'answers have')} not been sent yet. They stay on this device for you and go out when you sign in here again.`,
  },
} as const;
