import { numberText } from './numbers.ts';

const { percent, seconds, count, points } = numberText;
const AUFS = { 1: 'U', 2: 'U2', 3: 'U′' } as const;

interface CasesTwice {
  readonly set: string;
  readonly other: string;
  readonly cases: number;
  /** By nickname; null for everyone. */
  readonly who: readonly string[] | null;
}

/** At most this many people are named. */
const NAMED = 3;

function answering(who: readonly string[] | null): string {
  if (who === null) return 'everyone answers';
  if (who.length === 1) return `${who[0]} answers`;
  const rest = who.length - NAMED;
  const named = rest > 0 ? [...who.slice(0, NAMED), `${rest} more`] : who;
  return `${named.slice(0, -1).join(', ')} and ${named.at(-1)} answer`;
}

const ELSEWHERE = 'from answers in another set';

/** The captain's desk. */
export const deskText = {
  none: '–',
  notBegun: 'not begun',
  elsewhere: ELSEWHERE,
  never: 'never',
  today: 'today',
  yesterday: 'yesterday',
  daysAgo: (days: number) => `${days} days ago`,

  figureLabel: (figure: {
    value: string;
    low: string;
    high: string;
    answers: number;
    elsewhere: boolean;
    change: string | null;
  }) =>
    `${figure.value}, between ${figure.low} and ${figure.high}, ${figure.elsewhere ? ELSEWHERE : count(figure.answers, 'answer', 'answers')}${figure.change ? `, ${figure.change} points in 28 days` : ''}`,

  squad: {
    title: 'Squad',
    titleOfGroups: (set: string) => `Squad, ${set} by group`,
    lead: (limit: string | null) =>
      `Dealt recall now: the chance that the next case a solve deals is named, with its AUF where it is asked, ${limit === null ? 'inside the limit of its set' : `inside ${limit}`}.`,
    key: 'The tick is the figure in per cent, the bar its 90 % interval. Hollow: fewer than 20 answers in 28 days. A mean leaves out who has not begun.',
    limit: (limitMs: number) => seconds(limitMs),
    view: 'Show',
    allSets: 'All sets',
    member: 'Member',
    changeOf: (name: string) => `${name}: `,
    change: 'Change, 28 days',
    answers: 'Answers, 28 days',
    lastTrained: 'Last trained',
    minutes: 'Min a day',
    minutesOf: (minutes: number) => minutes.toFixed(1),
    all: 'All',
    ungrouped: 'Other',
    dealt: (share: number) => percent(share),
    dealtLong: ' of solves, ',
    mean: (value: number) => `mean ${Math.round(value * 100)}`,
    meanWithout: (notBegun: number) => (notBegun > 0 ? `, ${notBegun} not begun` : ''),
    notAnswering: 'not assigned',
    csv: 'Download CSV',
    csvFile: (set: string | null, date: string) => `squad${set ? `-${set}` : ''}-${date}.csv`,
    csvHead: {
      role: 'Role',
      recall: (name: string) => `${name}, dealt recall %`,
      low: (name: string) => `${name}, from %`,
      high: (name: string) => `${name}, to %`,
      answersOf: (name: string) => `${name}, answers in 28 days`,
      change: (name: string) => `${name}, change in points over 28 days`,
      answers: 'Answers in 28 days',
      minutes: 'Minutes a day over 28 days',
    },
    roles: { member: 'member', captain: 'captain' },
    empty: 'Nobody is in the club yet',
    noProgramme: 'No set is assigned yet',
    noProgrammeLead: 'Members have nothing to train until you assign a set.',
    toProgramme: 'Assign a set',
    lost: 'Where solves are lost',
    lostLead: 'Share of solves lost to a case, mean of the squad.',
    lostNone: 'Nothing is lost: every case holds for everyone.',
    lostShare: (share: number) => percent(share, share < 0.01 ? 2 : 1),
    board: (name: string, edition: number) => `Standings, ${name} edition ${edition}`,
    boardEmpty:
      'Nobody is ranked yet: it takes 20 answers in 28 days, and the member’s own word to be shown.',
    wholeBoard: 'Whole board',
  },

  lostBy: {
    late: (s: number) => `late: ${s.toFixed(1)} s`,
    auf: (turns: 1 | 2 | 3 | null) =>
      turns === null ? 'AUF before off' : `AUF before off by ${AUFS[turns]}`,
    unrecognised: 'not recognised',
    named: (name: string) => `named ${name}`,
    mirror: (name: string) => `mirror, named ${name}`,
    solved: 'named solved',
    unknownCase: 'another case',
    unmet: (who: readonly string[], members: number) =>
      who.length === members
        ? 'not met by anyone yet'
        : `not met yet by ${who.length <= 2 ? who.join(' and ') : `${who.length} of ${members}`}`,
    fading: 'not asked lately, fading',
  },

  member: {
    title: 'Member',
    back: 'Squad',
    lastTrained: (when: string) => `Last trained ${when}.`,
    neverTrained: 'Has not trained yet.',
    captain: 'Captain, trains like the others.',
    trend: (set: string) => `${set}: dealt recall over 90 days`,
    notBegun: 'Not begun: no case of it has been answered yet.',
    trendTooShort: 'A line appears after two days of answers.',
    interval: (low: string, high: string) => `${low} to ${high}`,
    now: 'now',
    date: 'Date',
    recall: 'Dealt recall',
    from: 'from',
    to: 'to',
    edition: (edition: number) => `dealt recall, edition ${edition}`,
    answers: (answers: number) => `${count(answers, 'answer', 'answers')} in 28 days`,
    noSets: 'Answers for no set',
    noSetsLead: 'The programme says who answers for what.',
    outcomes: 'Outcomes, last 28 days',
    noAnswers: 'No answers in the last 28 days.',
    rates: { held: 'held', late: 'late', missed: 'missed', left: 'left', misTaps: 'mis-taps' },
    rateOf: (name: string, of: number, all: number) => `${name}, ${of} of ${all}`,
    weakest: 'Weakest cases',
    weakestLead:
      'Most solves lost first: how often a solve deals the case, times the chance that it is not held.',
    weakestCount: (shown: number, all: number) => `${shown} of ${count(all, 'case', 'cases')}`,
    showAll: 'Show all cases',
    showFewer: 'Show fewer',
    columns: {
      case: 'Case',
      state: 'State',
      recall: 'Recall',
      answers: 'Answers',
      last: 'Last',
      lost: 'Lost',
      at: 'When',
      named: 'Named',
      outcome: 'Outcome',
      time: 'Time',
      lostBy: 'Lost by',
    },
    outcome: { held: 'held', late: 'late', missed: 'missed', left: 'left' },
    lately: 'Latest answers',
    latelyCaption: 'The newest 30, by when they were given; time to the moment of recognition.',
    latelyNone: 'No answers yet.',
    namedWords: {
      solved: 'solved',
      unrecognised: 'not recognised',
      lost: 'no name',
      left: 'left',
    },
    misTap: 'mis-tap',
    seconds: (ms: number) => seconds(ms, 2),
  },

  standings: {
    title: 'Standings',
    titleOf: (set: string) => `Standings, ${set}`,
    lead: (days: number) =>
      `Dealt recall, mean of the last ${days} days. Ranked by the low end of the interval: a figure that rests on little stands lower until it rests on more.`,
    sets: 'Set',
    inClub: 'In the club',
    conditions: (edition: number, limitMs: number) => `edition ${edition}, limit ${seconds(limitMs)}`,
    caption: (name: string) => `Standings, ${name}`,
    rank: 'Rank',
    member: 'Member',
    figure: 'Dealt recall',
    low: 'Ranked at',
    rests: 'Rests on',
    restsOn: (answers: number, days: number) =>
      `${count(answers, 'answer', 'answers')}, ${count(days, 'day', 'days')}`,
    unranked: 'Not ranked',
    unrankedLead: (days: number) => `Fewer than 20 answers in ${days} days.`,
    isMe: 'you',
    notOptedIn: (people: number) =>
      people === 1
        ? 'One other member answers for this set and has not opted in.'
        : `${people} other members answer for this set and have not opted in.`,
    optInHow: 'Each member decides that under Club.',
    allOptedIn: 'Everyone who answers for this set has opted in.',
    empty: 'Nobody is on this board yet',
    emptyLead: 'Members come onto boards when they opt in under Club, and are ranked from 20 answers on.',
    noRanked: 'Nobody has 20 answers in these days yet.',
    none: 'No set is assigned yet',
    shared: 'Between clubs',
    sharedLead:
      'Figures of teams, never of people: the mean of the members active in 30 days, drawn towards the mean of all by as much as three members weigh.',
    sharedCaption: (name: string, set: string) => `${name}, ${set}`,
    team: (members: number) => count(members, 'member', 'members'),
    teamLabel: (value: string, low: string, high: string) => `${value}, between ${low} and ${high}`,
    mine: 'your club',
    noShared: 'Your club is on no shared board.',
    noTeams: 'No club has published a figure on this board yet.',
  },

  programme: {
    title: 'Programme',
    lead: 'What the club trains, and how an answer is judged. A change reaches the members’ Today at once.',
    caption: 'Sets on the programme',
    columns: {
      set: 'Set',
      edition: 'Edition',
      limit: 'Limit',
      auf: 'AUF before',
      who: 'Who answers',
      actions: 'Change',
    },
    newest: (edition: number | null) => (edition === null ? 'newest (none yet)' : `newest, now ${edition}`),
    pinned: (edition: number, newest: number | null) =>
      newest !== null && newest > edition ? `${edition}, newest is ${newest}` : `${edition}`,
    limit: (limitMs: number) => seconds(limitMs),
    inShort: (edition: string, limit: string, asksAuf: boolean) =>
      `Edition ${edition}; limit ${limit}; AUF ${asksAuf ? 'asked' : 'not asked'}.`,
    asked: 'asked',
    notAsked: 'not asked',
    everyone: 'everyone',
    nobody: 'nobody now',
    edit: 'Edit',
    editOf: (name: string) => `Edit ${name}`,
    withdraw: 'Withdraw',
    withdrawOf: (name: string) => `Withdraw ${name}`,
    empty: 'No set is assigned yet',
    emptyLead: 'Assign one below; members train it from their next showing on.',
    assignTitle: 'Assign another set',
    assignLead: 'Sets that have a published edition and are not on the programme.',
    noneLeft: 'Every set that has an edition is on the programme.',
    set: 'Set',
    setOption: (name: string, cases: number) => `${name}, ${count(cases, 'case', 'cases')}`,
    assignOf: (name: string) => `Assign ${name}`,
    save: 'Save',
    cancel: 'Cancel',
    saving: 'Saving',
    editTitle: (name: string) => `Change ${name}`,
    editionField: 'Edition',
    followNewest: (edition: number | null) =>
      edition === null ? 'Follow the newest' : `Follow the newest, now ${edition}`,
    pinTo: (edition: number) => `Stay on edition ${edition}`,
    limitField: 'Limit, in seconds',
    limitHint:
      'A recognition time up to the limit is held; later is late. From 0.5 to 60. Figures go on resting on what was answered under the old limit until new answers come.',
    aufField: 'AUF before',
    aufAsk: 'Ask for it',
    aufNot: 'Do not ask',
    aufHint: 'A right case with a wrong AUF counts as missed.',
    whoField: 'Who answers',
    whoEveryone: 'Everyone in the club',
    whoChosen: 'Chosen members',
    whoMembers: 'Members',
    whoTickAll: 'Tick all',
    whoTickNone: 'Tick none',
    problemTitle: 'This cannot be saved yet',
    limitMissing: 'Type a limit in seconds, like 3 or 2.5.',
    limitOutside: 'The limit lies between 0.5 and 60 seconds.',
    whoMissing: 'Choose at least one member.',
    staleTitle: 'Changed meanwhile',
    staleLead: 'Someone else changed this set. What stands now is shown above; make your change again.',
    assigned: (name: string) => `${name} is on the programme. Members see it in their next Today.`,
    changed: (name: string) => `${name} is changed.`,
    withdrawn: (name: string) => `${name} is off the programme. Its answers and memory are kept.`,
    withdrawTitle: (name: string) => `Withdraw ${name}?`,
    withdrawBody: 'Members are no longer asked its cases, from their next showing on.',
    withdrawKeeps:
      'Answers, memory and figures are kept: assign the set again and everyone goes on where they were.',
    withdrawConfirm: 'Withdraw',
    keep: 'Keep it',
    problems: {
      noSet: 'There is no such set.',
      noEdition: 'That set has no published edition yet.',
      noSuchEdition: (edition: number) => `There is no edition ${edition} of that set.`,
      nobody: 'Choose at least one member, or everyone.',
      notOurs: 'Somebody chosen is not in your club.',
      taken: 'The set is on the programme already. Look at it again before you change it.',
      changed: 'Someone else changed or withdrew this set meanwhile. Look at it again.',
      gone: 'That set is not on the programme.',
      casesTwice: ({ set, other, cases, who }: CasesTwice) =>
        `${set} and ${other} share ${cases === 1 ? 'a case' : `${cases} cases`}, and ${answering(who)} for ${
          cases === 1 ? 'it' : 'them'
        } through ${other} already. First edit ${other} to Chosen members without ${
          who?.length === 1 ? who[0] : `those who are to answer for ${set}`
        }, or withdraw ${other} if nobody needs it. What was learned stays.`,
    },
  },
  points,
} as const;
