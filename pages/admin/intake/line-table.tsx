import { type FormEvent, useState } from 'react';
import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { AlgorithmText, FlatView } from '#renderer/ui/index.ts';
import type { DraftLine } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { numberText } from '#shared/text/numbers.ts';
import { AlgorithmInput, CaseInput, formOf, type LineEdit, wrongPart } from './line-edit.tsx';
import { EditKeys, LineFinding } from './line-finding.tsx';
import type { DraftSteps, Step } from './use-draft-steps.ts';

const text = intakeText.draft;
const LINES = 'lines';

/** The lines of a draft, each with its picture and its finding; one at a time can be edited in place. */
export function LineTable({
  lines,
  open,
  steps,
  empty,
}: {
  lines: readonly DraftLine[];
  open: boolean;
  steps: DraftSteps;
  empty: string;
}) {
  const [edit, setEdit] = useState<LineEdit | null>(null);
  const leave = (line: number) => {
    setEdit(null);
    focusFinding(line);
  };
  const step = (to: Step) => steps.settle(to, () => leave(to.line));
  const save = (event: FormEvent) => {
    event.preventDefault();
    if (edit && steps.busyLine === null) step({ ...edit, decision: 'none' });
  };
  const editOf = (line: DraftLine) =>
    edit?.line === line.line
      ? {
          line,
          edit,
          onChange: (change: Partial<LineEdit>) => setEdit({ ...edit, ...change }),
          onCancel: () => leave(line.line),
        }
      : null;

  const columns: readonly LedgerColumn<DraftLine>[] = [
    {
      key: 'line',
      header: text.columns.line,
      className: 'lg:w-14 text-ink-2',
      stacked: 'col-start-2 row-start-1 text-sm',
      cell: ({ line }) => (
        <>
          <span aria-hidden="true" className="hidden lg:inline">
            {line}
          </span>
          <span className="lg:sr-only">{text.lineNumber(line)}</span>
        </>
      ),
    },
    {
      key: 'picture',
      header: text.columns.picture,
      headerHidden: true,
      className: 'lg:w-24 lg:py-2!',
      stacked: 'col-start-1 row-start-1 row-span-4',
      cell: ({ picture }) =>
        picture && (
          <FlatView stickers={picture.stickers} colouring={picture.colouring} className="w-14 lg:w-15" />
        ),
    },
    {
      key: 'case',
      header: text.columns.case,
      rowHeader: true,
      className: 'lg:w-22',
      stacked: 'col-start-2 row-start-2',
      cell: (line) => {
        const editing = editOf(line);
        if (editing) return <CaseInput {...editing} />;
        return (
          <>
            <span className="break-words">{line.caseName || text.none}</span>
            {line.prior && (
              <span className="ps-3 font-normal text-ink-2 lg:hidden">{numberText.oneIn(line.prior)}</span>
            )}
          </>
        );
      },
    },
    {
      key: 'algorithm',
      header: text.columns.algorithm,
      stacked: 'col-start-2 row-start-3 min-w-0',
      className: 'lg:pe-8!',
      cell: (line) => {
        const editing = editOf(line);
        if (editing) return <AlgorithmInput {...editing} />;
        return (
          <AlgorithmText
            text={line.algorithm || text.none}
            wrong={wrongPart(line)}
            className={`break-words ${line.standing === 'out' ? 'line-through' : ''}`}
          />
        );
      },
    },
    {
      key: 'solves',
      header: text.columns.solves,
      className: 'lg:w-20 font-bold',
      stacked: 'hidden lg:table-cell',
      cell: ({ solves }) => solves ?? text.none,
    },
    {
      key: 'prior',
      header: text.columns.prior,
      className: 'lg:w-26 whitespace-nowrap',
      stacked: 'hidden lg:table-cell',
      cell: ({ prior }) => prior && numberText.oneIn(prior),
    },
    {
      key: 'finding',
      header: text.columns.finding,
      className: 'lg:w-72 xl:w-[22rem]',
      stacked: 'col-start-2 row-start-4 mt-1 lg:mt-0',
      cell: (line) => {
        const editing = editOf(line);
        const busy = steps.busyLine === line.line;
        if (editing) {
          return (
            <form id={formOf(line.line)} onSubmit={save}>
              <EditKeys formId={formOf(line.line)} busy={busy} onCancel={editing.onCancel} />
            </form>
          );
        }
        return (
          <LineFinding
            line={line}
            open={open}
            busy={busy}
            onStep={step}
            onEdit={() => setEdit({ line: line.line, caseName: line.caseName, algorithm: line.algorithm })}
          />
        );
      },
    },
  ];
  return (
    <div id={LINES} tabIndex={-1} className="outline-none">
      <LedgerTable
        caption={text.caption}
        columns={columns}
        rows={lines}
        rowKey={({ line }) => String(line)}
        rowClass={({ standing }) => (standing === 'out' ? 'text-ink-2' : '')}
        stackedRow="grid-cols-[3.5rem_minmax(0,1fr)]"
        empty={empty}
      />
    </div>
  );
}

/** After a step the key that was pressed is gone: the focus goes to what the line says now, or to the lines left. */
function focusFinding(line: number): void {
  requestAnimationFrame(() => {
    const next = document.getElementById(`finding-${line}`) ?? document.getElementById(LINES);
    next?.focus({ preventScroll: true });
  });
}
