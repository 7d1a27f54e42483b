import { Button, Finding, type FindingTone } from '#renderer/ui/index.ts';
import type { DraftLine } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import type { Step } from './use-draft-steps.ts';

const text = intakeText.draft;

const TONES: Readonly<Record<DraftLine['standing'], FindingTone>> = {
  fine: 'agrees',
  out: 'agrees',
  decide: 'decide',
  cannot: 'cannot',
};

interface Action {
  readonly label: string;
  readonly run: () => void;
}

/** What was found on a line, what was done about it, and what can be done. */
export function LineFinding({
  line,
  open,
  busy,
  onStep,
  onEdit,
}: {
  line: DraftLine;
  /** Whether the draft still takes steps. */
  open: boolean;
  busy: boolean;
  onStep: (step: Step) => void;
  onEdit: () => void;
}) {
  const { title, detail, before } = words(line);
  const actions = open ? actionsOf(line, onStep, onEdit) : [];
  return (
    <div
      id={`finding-${line.line}`}
      tabIndex={-1}
      aria-busy={busy}
      className={`outline-none ${TONES[line.standing] === 'agrees' ? 'max-lg:-ms-3.5' : ''}`}
    >
      <Finding tone={TONES[line.standing]} title={title}>
        <p className="flex flex-wrap items-center">
          {detail && (
            <span className="min-w-0 break-words py-0.5">
              {detail}
              {actions.length > 0 && <Dot />}
            </span>
          )}
          {actions.map(({ label, run }, at) => (
            <span key={label} className="screen-only inline-flex items-center">
              <button
                type="button"
                aria-label={text.forLine(label, line.line)}
                aria-disabled={busy || undefined}
                onClick={busy ? undefined : run}
                className="inline-flex min-h-12 items-center underline decoration-line underline-offset-4 hover:text-ink hover:decoration-ink lg:min-h-7"
              >
                {label}
              </button>
              {at < actions.length - 1 && <Dot />}
            </span>
          ))}
        </p>
        {before && <p className="break-words">{before}</p>}
      </Finding>
    </div>
  );
}

/** Parts stand on one line with dots between them, and break between the parts. */
function Dot() {
  return (
    <span aria-hidden="true" className="px-1.5">
      ·
    </span>
  );
}

/** The heading, what follows from it, and what stood in the file where it was typed over. */
function words(line: DraftLine): { title: string; detail: string; before?: string } {
  const { says, hint, standing, decision, original } = line;
  if (standing === 'out') return { title: text.dropped, detail: [says, hint].filter(Boolean).join(', ') };
  if (decision === 'take' && line.solves !== null) {
    return { title: text.taken(line.solves), detail: text.takenHint(line.caseName) };
  }
  if (!original) return { title: says, detail: hint };
  const changed = [
    ...(original.caseName === line.caseName ? [] : [original.caseName]),
    ...(original.algorithm === line.algorithm ? [] : [intakeText.printed(original.algorithm)]),
  ].filter(Boolean);
  return {
    title: says,
    detail: hint,
    before: changed.length > 0 ? text.fileSaid(changed.join(', ')) : text.fileSaidNothing,
  };
}

function actionsOf(line: DraftLine, onStep: (step: Step) => void, onEdit: () => void): Action[] {
  const { line: number, standing, decision, solves, original } = line;
  const back = (): void =>
    onStep({
      line: number,
      decision: 'none',
      ...(decision === 'none' && original
        ? { caseName: original.caseName, algorithm: original.algorithm }
        : {}),
    });
  const takeBack = { label: text.takeBack, run: back };
  if (standing === 'out') return [takeBack];
  const actions: Action[] = [];
  if (standing === 'decide' && line.finding === 'solves-other' && solves) {
    actions.push({ label: text.take(solves), run: () => onStep({ line: number, decision: 'take' }) });
  }
  actions.push({ label: text.edit, run: onEdit });
  if (decision !== 'take') {
    actions.push({ label: text.drop, run: () => onStep({ line: number, decision: 'drop' }) });
  }
  if (decision === 'take' || original) actions.push(takeBack);
  return actions;
}

/** In place of the finding while a line is edited. The inputs stand in the row's other cells. */
export function EditKeys({
  formId,
  busy,
  onCancel,
}: {
  formId: string;
  busy: boolean;
  onCancel: () => void;
}) {
  return (
    <div className="flex flex-wrap items-center gap-3 max-lg:mt-1">
      <Button type="submit" form={formId} size="small" busy={busy}>
        {text.save}
      </Button>
      <Button kind="plain" size="small" onClick={onCancel}>
        {text.cancel}
      </Button>
      {busy && <span className="appear-late text-sm text-ink-2">{text.busy}</span>}
    </div>
  );
}
