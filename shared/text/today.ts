import { todayWords } from './today-words.ts';

const seconds = (ms: number): string => (ms / 1000).toFixed(1);
const limit = (ms: number): string => (ms / 1000).toFixed(ms % 1000 === 0 ? 0 : 1);
const plural = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;
const percent = (share: number): string => `${Math.round(share * 100)}%`;

function aboutMinutes(secondsLeft: number): string {
  const minutes = Math.round(secondsLeft / 60);
  return minutes < 1 ? 'under 1 min' : `about ${minutes} min`;
}

/** Words of the Today screen. Nothing here may depend on the case before it is named. */
export const todayText = {
  title: 'Today',
  progress: (answered: number, planned: number, secondsLeft: number) =>
    `${answered} of ${planned} · ${aboutMinutes(secondsLeft)}`,
  progressLabel: 'Showings of today',
  progressText: (answered: number, planned: number) => `${answered} of ${planned} answered`,

  ready: {
    heading: (count: number) => plural(count, 'showing', 'showings'),
    resumed: (count: number) => `${plural(count, 'showing', 'showings')} left`,
    how: [
      'Press Got it the moment you know the case. The clock stops and the picture goes.',
      'Then name the case, and its AUF before where it is asked.',
    ],
    sets: (names: readonly string[]) => names.join(', '),
    setsAndTime: (sets: string, secondsLeft: number) => `${sets} · ${aboutMinutes(secondsLeft)}`,
    begin: 'Begin',
    goOn: 'Go on',
    hint: 'the clock starts with the picture',
  },

  gotIt: 'Got it',
  gotItHint: 'the clock stops, the picture goes',
  notRecognised: 'I don’t recognise it',
  /** Said of the showing before while the next picture is up; tells nothing of either case. */
  passing: (ms: number, scored: boolean) =>
    `held in ${seconds(ms)} s${scored ? '' : ', not scored: naming took over 5 s'}`,

  caseLegend: 'Case',
  recognisedIn: (ms: number) => `recognised in ${seconds(ms)} s`,
  solved: todayWords.solved,
  /** A case by the club's name and the trade's. */
  alsoCalled: (name: string, tradeName: string) => `${name}, ${tradeName}`,
  lost: 'lost it',
  aufLegend: 'AUF before',
  aufFor: (firstMoves: string) => `for ${firstMoves} …`,
  slowNaming: 'Over 5 s: this answer will not be scored.',
  keysHint: 'Keys: type the name, or go to it with the arrows and press Enter. Then 0 to 3 for the AUF.',

  sending: 'Sending the answer.',

  times: (recognitionMs: number | null, limitMs: number) =>
    recognitionMs === null
      ? `limit ${limit(limitMs)} s`
      : `${seconds(recognitionMs)} s, limit ${limit(limitMs)} s`,
  itWas: 'it was',
  named: 'named',
  late: 'right, but over the limit',
  rightCase: 'right case, wrong AUF before',
  notRecognisedWord: 'not recognised',
  lostWord: 'recognised, then lost',
  verdictStatus: {
    late: (name: string) => `Late. It was ${name}: right, but over the limit.`,
    missed: (name: string, named: string | null) =>
      named === null ? `Missed. It was ${name}.` : `Missed. It was ${name}; you named ${named}.`,
    auf: (name: string) => `Missed. It was ${name}; the AUF before was not right.`,
  },
  rows: {
    differsAt: 'differs at',
    aufBefore: 'AUF before',
    algorithm: 'algorithm',
    lostBy: 'lost by',
    back: 'back',
    score: 'scored',
  },
  notScored: (reason: string | null) => (reason === 'slow naming' ? 'no: naming took over 5 s' : 'no'),
  /** What follows is the AUF that was given, struck through. */
  aufNot: (right: string) => `${right}, not `,
  /** One who recognised the case and then had no name for it did not lose it by not recognising it. */
  lostBy: (aspect: string, named: string | null) =>
    named === 'lost' ? 'its name, gone after recognising' : aspect === 'late' ? 'time' : aspect,
  back: (thisSitting: boolean, when: string | null) =>
    thisSitting && when !== null
      ? `in this sitting, then ${when}`
      : thisSitting
        ? 'in this sitting'
        : (when ?? 'when it is due'),
  misTap: 'mis-tap',
  misTapDone: 'Mis-tap noted. Memory goes on without this answer; boards keep it.',
  goOn: 'Go on',

  answers: {
    waiting: (count: number) => `${plural(count, 'answer', 'answers')} waiting to be sent`,
    offline: (count: number) =>
      count === 0 ? 'offline' : `offline: ${plural(count, 'answer', 'answers')} kept on this device`,
    signedOut: (count: number) =>
      `Your session has ended. ${plural(count, 'answer is', 'answers are')} kept on this device until you sign in again.`,
    otherPerson:
      'Another person or club is signed in on this device now. Reload the page to go on; unsent answers stay with their owner.',
    refused: (count: number, detail: string) =>
      `${plural(count, 'answer was', 'answers were')} not taken. ${detail}`,
    saved: 'All answers are saved.',
    signIn: 'Sign in again',
    reload: 'Reload',
    retry: 'Send now',
    dismiss: 'Close',
  },
  runOut: {
    title: 'No more pictures on this device',
    detail: 'The next ones come when your answers have reached the club.',
  },

  empty: {
    'no-programme': {
      title: 'Nothing is on your programme yet',
      detail: 'Your captain chooses the case sets. When one is handed to you, its cases come here.',
    },
    'no-edition': {
      title: 'Your sets are not published yet',
      detail: 'The set on your programme has no published edition. It comes here as soon as it has one.',
    },
    'nothing-due': {
      title: 'Nothing is due today',
      detail: 'Every case on your programme is above what is wanted of it, and there is no new one to meet.',
    },
    done: { title: 'Done for today', detail: 'Nothing is left in today’s queue.' },
  },

  summary: {
    title: 'Done for today',
    why: 'Your minutes are used, or nothing more is due. What is still due waits for tomorrow.',
    held: 'held',
    late: 'late',
    missed: 'missed',
    left: 'left',
    newCases: 'new cases',
    median: 'median recognition',
    seconds: (ms: number) => `${seconds(ms)} s`,
    minutes: (minutes: number) => `${Math.max(1, Math.round(minutes))} min`,
    time: 'spent',
    moved: 'Dealt recall',
    movedNote: 'the chance that the next case a solve deals is held',
    movedText: (before: number, now: number) => `${percent(before)} → ${percent(now)}`,
    movedLabel: (name: string, before: number, now: number) =>
      `${name}: from ${percent(before)} to ${percent(now)}`,
    lost: 'Lost today',
    lostNone: 'Nothing was lost today.',
    tomorrow: 'Tomorrow',
    tomorrowText: (due: number, fresh: number, minutes: number) =>
      due + fresh === 0
        ? 'Nothing is due.'
        : `${plural(due, 'case is', 'cases are')} due${fresh > 0 ? `, ${fresh} new` : ''}: ${aboutMinutes(minutes * 60)}.`,
  },
  toCases: 'My cases',
  toForm: 'Form',
  rest: 'A quarter of an hour is a good stretch. Rest hands and eyes for a moment.',
} as const;
