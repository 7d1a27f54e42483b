import { type Column, cx, DataTable } from '#renderer/ui/index.ts';
import type { MemberPageView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.member;

type Answer = MemberPageView['lately'][number];

/** A member's newest answers, each with what it was lost by. */
export function LatestAnswers({ answers, timeZone }: { answers: readonly Answer[]; timeZone: string }) {
  const columns: readonly Column<Answer>[] = [
    {
      key: 'at',
      header: text.columns.at,
      cell: (row) => when(row.at, timeZone),
      nowrap: true,
      className: 'text-ink-2',
    },
    {
      key: 'case',
      header: text.columns.case,
      rowHeader: true,
      nowrap: true,
      cell: (row) => (
        <>
          <span className="pe-1.5 text-sm font-normal text-ink-2">{row.setName}</span>
          {row.name}
        </>
      ),
    },
    {
      key: 'outcome',
      header: text.columns.outcome,
      cell: (row) => (
        <span className={cx(row.outcome === 'missed' && 'font-bold text-rose')}>
          {text.outcome[row.outcome]}
        </span>
      ),
    },
    {
      key: 'named',
      header: text.columns.named,
      cell: (row) => (row.named === row.name ? '' : row.named),
    },
    {
      key: 'time',
      header: text.columns.time,
      align: 'end',
      nowrap: true,
      cell: (row) => (row.recognitionMs === null ? deskText.none : text.seconds(row.recognitionMs)),
    },
    { key: 'lostBy', header: text.columns.lostBy, cell: (row) => row.lostBy ?? '' },
  ];
  return (
    <DataTable
      caption={text.latelyCaption}
      columns={columns}
      rows={answers}
      rowKey={(row) => row.id}
      density="tight"
      empty={text.latelyNone}
    />
  );
}

function when(at: number, timeZone: string): string {
  return new Date(at).toLocaleString('en-GB', {
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
    timeZone,
  });
}
