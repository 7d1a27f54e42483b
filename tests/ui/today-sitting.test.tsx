import { describe, expect, it } from 'vitest';
import { advance, type Sitting, type Step, startSitting } from '#pages/member/today/sitting.ts';
import { someAnswer, someVerdict, someView, uuidOf } from './today-support.ts';

/** A sitting after these steps. */
function played(start: Sitting, ...steps: Step[]): Sitting {
  return steps.reduce(advance, start);
}

const begun = (...showings: number[]) => played(startSitting(someView(showings)), { kind: 'begin' });
const shown = (sitting: Sitting) => (sitting.phase.kind === 'looking' ? sitting.phase.showing.id : null);

describe('a sitting', () => {
  it('waits for the person before the first picture', () => {
    expect(startSitting(someView([1, 2])).phase.kind).toBe('ready');
    expect(shown(begun(1, 2))).toBe(uuidOf(1));
  });

  it('is over at once when nothing is to be shown', () => {
    expect(startSitting(someView([])).phase.kind).toBe('over');
  });

  it('goes from the picture to naming to sending, and on by itself when held', () => {
    const naming = played(begun(1, 2), { kind: 'got-it', recognitionMs: 1_800 });
    expect(naming.phase).toMatchObject({ kind: 'naming', recognitionMs: 1_800 });
    const sending = advance(naming, { kind: 'answer', answer: someAnswer(1) });
    expect(sending.phase.kind).toBe('sending');
    const next = advance(sending, {
      kind: 'verdicts',
      verdicts: [someVerdict(1, 'held')],
      view: someView([2], { answered: 1 }),
    });
    expect(shown(next)).toBe(uuidOf(2));
    expect(next.held?.was.name).toBe('T');
    expect(next.waiting.size).toBe(0);
  });

  it.each(['late', 'missed'] as const)('stops at a verdict when %s, and goes on when told to', (outcome) => {
    const verdict = played(
      begun(1, 2),
      { kind: 'got-it', recognitionMs: 3_400 },
      { kind: 'answer', answer: someAnswer(1) },
      { kind: 'verdicts', verdicts: [someVerdict(1, outcome)], view: someView([2, 3]) },
    );
    expect(verdict.phase).toMatchObject({ kind: 'verdict', misTapped: false });
    expect(advance(verdict, { kind: 'mis-tap' }).phase).toMatchObject({ misTapped: true });
    expect(shown(advance(verdict, { kind: 'go-on' }))).toBe(uuidOf(2));
  });

  it('never puts up a picture again that was answered here, whatever an older view says', () => {
    const next = played(
      begun(1, 2),
      { kind: 'answer', answer: someAnswer(1, { named: 'unrecognised' }) },
      { kind: 'no-verdict', ids: [uuidOf(1_001)] },
      { kind: 'view', view: someView([1, 2]) },
    );
    expect(shown(next)).toBe(uuidOf(2));
  });

  it('leaves the picture that is up alone when a new view comes', () => {
    const sitting = begun(1, 2, 3);
    expect(shown(advance(sitting, { kind: 'view', view: someView([2, 3]) }))).toBe(uuidOf(1));
  });

  it('goes on without a verdict, and shows a loss that comes later before the next picture', () => {
    const on = played(
      begun(1, 2, 3),
      { kind: 'answer', answer: someAnswer(1) },
      { kind: 'no-verdict', ids: [uuidOf(1_001)] },
    );
    expect(shown(on)).toBe(uuidOf(2));
    const told = advance(on, {
      kind: 'verdicts',
      verdicts: [someVerdict(1, 'missed')],
      view: someView([2, 3]),
    });
    expect(shown(told)).toBe(uuidOf(2));
    const second = played(
      told,
      { kind: 'answer', answer: someAnswer(2) },
      { kind: 'verdicts', verdicts: [someVerdict(2, 'held')], view: someView([3]) },
    );
    expect(second.phase).toMatchObject({ kind: 'verdict', judged: { verdict: { id: uuidOf(1_001) } } });
    expect(shown(advance(second, { kind: 'go-on' }))).toBe(uuidOf(3));
  });

  it('does not stop for another answer’s fate', () => {
    const sending = played(begun(1, 2), { kind: 'answer', answer: someAnswer(1) });
    expect(advance(sending, { kind: 'no-verdict', ids: [uuidOf(9_999)] }).phase.kind).toBe('sending');
  });

  it('takes a picture that is left as answered, and puts up the next', () => {
    const left = played(begun(1, 2), { kind: 'leave', answer: someAnswer(1, { named: 'left' }) });
    expect(shown(left)).toBe(uuidOf(2));
    // What was left is no loss to be told of.
    const told = advance(left, { kind: 'verdicts', verdicts: [someVerdict(1, 'left')], view: someView([2]) });
    expect(told.behind).toHaveLength(0);
  });

  it('notes no leaving where no picture is up', () => {
    const verdict = played(
      begun(1, 2),
      { kind: 'answer', answer: someAnswer(1) },
      { kind: 'verdicts', verdicts: [someVerdict(1, 'missed')], view: someView([2]) },
    );
    expect(advance(verdict, { kind: 'leave', answer: someAnswer(2) })).toBe(verdict);
  });

  it('waits when its pictures have run out and answers are on their way', () => {
    const out = played(
      begun(1),
      { kind: 'answer', answer: someAnswer(1) },
      { kind: 'no-verdict', ids: [uuidOf(1_001)] },
    );
    expect(out.phase.kind).toBe('run-out');
    const more = advance(out, { kind: 'verdicts', verdicts: [someVerdict(1, 'held')], view: someView([2]) });
    expect(shown(more)).toBe(uuidOf(2));
    const none = advance(out, { kind: 'verdicts', verdicts: [someVerdict(1, 'held')], view: someView([]) });
    expect(none.phase.kind).toBe('over');
  });

  it('takes up the unsent answers of an earlier visit', () => {
    const resumed = played(startSitting(someView([1, 2, 3])), {
      kind: 'resume',
      given: new Set([uuidOf(2)]),
      unsent: [someAnswer(1)],
    });
    expect(resumed.phase.kind).toBe('ready');
    expect(shown(advance(resumed, { kind: 'begin' }))).toBe(uuidOf(3));
  });

  it('begins anew when the day brings more after it was over', () => {
    const over = startSitting(someView([]));
    expect(advance(over, { kind: 'view', view: someView([5]) }).phase.kind).toBe('ready');
  });

  it('shows only the last three of many late losses', () => {
    const sitting = played(begun(1, 2, 3, 4, 5, 6), {
      kind: 'verdicts',
      verdicts: [11, 12, 13, 14, 15].map((k) => someVerdict(k, 'missed')),
      view: someView([1, 2, 3, 4, 5, 6]),
    });
    expect(sitting.behind.map((judged) => judged.verdict.id)).toEqual(
      [13, 14, 15].map((k) => uuidOf(1_000 + k)),
    );
  });
});
