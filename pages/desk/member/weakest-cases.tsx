import { useState } from 'react';
import { Button, type Column, DataTable, FlatView, Section } from '#renderer/ui/index.ts';
import type { MyCase } from '#shared/contracts/member.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';
import { StateMark } from '../../member/state-mark.tsx';

const text = deskText.member;
const { percent } = numberText;
const SHOWN = 12;

const columns: readonly Column<MyCase>[] = [
  {
    key: 'case',
    header: text.columns.case,
    rowHeader: true,
    cell: (row) => (
      <span className="flex items-center gap-3">
        <FlatView
          stickers={row.picture.stickers}
          colouring={row.picture.colouring}
          className="w-11 shrink-0"
        />
        <span>
          <span className="block text-xs font-normal text-ink-2">{row.setName}</span>
          {row.name}
          {row.tradeName && <span className="ps-1.5 font-normal text-ink-2">{row.tradeName}</span>}
        </span>
      </span>
    ),
  },
  { key: 'state', header: text.columns.state, cell: (row) => <StateMark state={row.state} /> },
  {
    key: 'recall',
    header: text.columns.recall,
    align: 'end',
    cell: (row) => (row.recall === null ? deskText.none : percent(row.recall)),
  },
  {
    key: 'lost',
    header: text.columns.lost,
    align: 'end',
    cell: (row) => percent((row.prior.weight / row.prior.total) * (1 - (row.recall ?? 0)), 1),
  },
  { key: 'answers', header: text.columns.answers, align: 'end', cell: (row) => row.answers },
  {
    key: 'last',
    header: text.columns.last,
    cell: (row) => (row.lastOutcome === null ? deskText.none : text.outcome[row.lastOutcome]),
  },
];

/** A member's cases, those that lose most solves first. */
export function WeakestCases({ cases }: { cases: readonly MyCase[] }) {
  const [all, setAll] = useState(false);
  const shown = all ? cases : cases.slice(0, SHOWN);
  return (
    <Section title={text.weakest} aside={text.weakestCount(shown.length, cases.length)}>
      <DataTable
        caption={text.weakestLead}
        columns={columns}
        rows={shown}
        rowKey={(row) => row.key}
        density="tight"
      />
      {cases.length > SHOWN && (
        <div className="screen-only mt-3">
          <Button kind="outlined" size="small" aria-expanded={all} onClick={() => setAll(!all)}>
            {all ? text.showFewer : text.showAll}
          </Button>
        </div>
      )}
    </Section>
  );
}
