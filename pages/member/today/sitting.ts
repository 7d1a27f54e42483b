import type { AnswerInput, Showing, TodayView, Verdict } from '#shared/contracts/today.ts';

/** A verdict to be looked at, with the answer it is about where this device still knows it. */
export interface Judged {
  readonly verdict: Verdict;
  readonly answer: AnswerInput | null;
}

export type Phase =
  | { readonly kind: 'ready' }
  | { readonly kind: 'looking'; readonly showing: Showing }
  | { readonly kind: 'naming'; readonly showing: Showing; readonly recognitionMs: number }
  | { readonly kind: 'sending'; readonly showing: Showing; readonly answer: AnswerInput }
  | { readonly kind: 'verdict'; readonly judged: Judged; readonly misTapped: boolean }
  /** Nothing left on this device, and answers on their way: what comes next is not known yet. */
  | { readonly kind: 'run-out' }
  | { readonly kind: 'over' };

export interface Sitting {
  readonly view: TodayView;
  readonly phase: Phase;
  /** Showings answered on this device: never shown again, whatever an older view says. */
  readonly done: ReadonlySet<string>;
  /** Answers whose verdict is not known yet, by id. */
  readonly waiting: ReadonlyMap<string, AnswerInput>;
  /** Losses whose verdict came after the person had gone on; they are shown before the next picture. */
  readonly behind: readonly Judged[];
  /** The last showing, when it was held: said in passing, while the next picture is there already. */
  readonly held: Verdict | null;
}

export type Step =
  /** What was answered on earlier visits: showings an old view may still list, and answers not sent yet. */
  | {
      readonly kind: 'resume';
      readonly given: ReadonlySet<string>;
      readonly unsent: readonly AnswerInput[];
    }
  | { readonly kind: 'begin' }
  | { readonly kind: 'view'; readonly view: TodayView }
  | { readonly kind: 'got-it'; readonly recognitionMs: number }
  | { readonly kind: 'answer'; readonly answer: AnswerInput }
  | { readonly kind: 'leave'; readonly answer: AnswerInput }
  | { readonly kind: 'verdicts'; readonly verdicts: readonly Verdict[]; readonly view: TodayView }
  /** The verdict of the answer being sent will not come soon, or never. */
  | { readonly kind: 'no-verdict'; readonly ids: readonly string[] }
  | { readonly kind: 'mis-tap' }
  | { readonly kind: 'go-on' };

/** So many losses of answers sent late are shown; more would be a lesson in what is long past. */
const MOST_BEHIND = 3;

/** A sitting before it begins. */
export function startSitting(view: TodayView): Sitting {
  return settled({
    view,
    phase: { kind: 'ready' },
    done: new Set(),
    waiting: new Map(),
    behind: [],
    held: null,
  });
}

/** The first picture that is not answered yet. */
export function nextShowing({ view, done }: Pick<Sitting, 'view' | 'done'>): Showing | null {
  return view.showings.find((showing) => !done.has(showing.id)) ?? null;
}

/** The showing whose picture has been put up and not answered yet. */
export function openShowing({ phase }: Pick<Sitting, 'phase'>): Showing | null {
  return phase.kind === 'looking' || phase.kind === 'naming' ? phase.showing : null;
}

export function advance(sitting: Sitting, step: Step): Sitting {
  const { phase } = sitting;
  switch (step.kind) {
    case 'resume':
      return settled(
        step.unsent.reduce(given, { ...sitting, done: new Set([...sitting.done, ...step.given]) }),
      );
    case 'begin':
      return phase.kind === 'ready' ? onwards(sitting) : sitting;
    case 'view':
      return settled({ ...sitting, view: step.view });
    case 'got-it':
      return phase.kind === 'looking'
        ? {
            ...sitting,
            held: null,
            phase: { kind: 'naming', showing: phase.showing, recognitionMs: step.recognitionMs },
          }
        : sitting;
    case 'answer': {
      const showing = openShowing(sitting);
      if (!showing) return sitting;
      const { answer } = step;
      return { ...given(sitting, answer), phase: { kind: 'sending', showing, answer } };
    }
    case 'leave':
      return openShowing(sitting) ? onwards(given(sitting, step.answer)) : sitting;
    case 'verdicts':
      return judge({ ...sitting, view: step.view }, step.verdicts);
    case 'no-verdict':
      return phase.kind === 'sending' && step.ids.includes(phase.answer.id) ? onwards(sitting) : sitting;
    case 'mis-tap':
      return phase.kind === 'verdict' ? { ...sitting, phase: { ...phase, misTapped: true } } : sitting;
    case 'go-on':
      return phase.kind === 'verdict' ? onwards(sitting) : sitting;
  }
}

function given(sitting: Sitting, answer: AnswerInput): Sitting {
  return {
    ...sitting,
    held: null,
    done: new Set([...sitting.done, answer.showingId]),
    waiting: new Map([...sitting.waiting, [answer.id, answer]]),
  };
}

function judge(sitting: Sitting, verdicts: readonly Verdict[]): Sitting {
  const { phase } = sitting;
  const waiting = new Map(sitting.waiting);
  const losses: Judged[] = [];
  let own: Judged | null = null;
  for (const verdict of verdicts) {
    const judged = { verdict, answer: waiting.get(verdict.id) ?? null };
    waiting.delete(verdict.id);
    if (phase.kind === 'sending' && phase.answer.id === verdict.id) own = judged;
    else if (verdict.outcome === 'late' || verdict.outcome === 'missed') losses.push(judged);
  }
  const next = { ...sitting, waiting, behind: [...sitting.behind, ...losses].slice(-MOST_BEHIND) };
  if (!own) return settled(next);
  if (own.verdict.outcome === 'held') return onwards({ ...next, held: own.verdict });
  return { ...next, phase: { kind: 'verdict', judged: own, misTapped: false } };
}

/** What comes next: a loss not yet seen, a picture, or the end. */
function onwards(sitting: Sitting): Sitting {
  const [loss, ...behind] = sitting.behind;
  if (loss) {
    return { ...sitting, behind, phase: { kind: 'verdict', judged: loss, misTapped: false } };
  }
  const showing = nextShowing(sitting);
  if (showing) return { ...sitting, phase: { kind: 'looking', showing } };
  return { ...sitting, phase: sitting.waiting.size > 0 ? { kind: 'run-out' } : { kind: 'over' } };
}

/** A new view changes nothing of what is on the screen, except where the screen was waiting for one. */
function settled(sitting: Sitting): Sitting {
  switch (sitting.phase.kind) {
    case 'run-out':
      return onwards(sitting);
    case 'over':
      return nextShowing(sitting) ? { ...sitting, phase: { kind: 'ready' } } : onwards(sitting);
    case 'ready':
      return nextShowing(sitting) ? sitting : onwards(sitting);
    default:
      return sitting;
  }
}
