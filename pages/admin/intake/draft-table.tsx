import { Instant } from '#renderer/instant.tsx';
import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { AppLink, TextLink } from '#renderer/ui/index.ts';
import type { IntakeView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';

type Draft = IntakeView['drafts'][number];
const text = intakeText.list;

const COLUMNS: readonly LedgerColumn<Draft>[] = [
  {
    key: 'file',
    header: text.fileName,
    rowHeader: true,
    stacked: 'col-span-2',
    cell: ({ draftId, fileName }) => (
      <AppLink
        href={`/admin/intake/${draftId}`}
        className="inline-flex min-h-12 items-center break-all underline underline-offset-4 lg:min-h-0"
      >
        {fileName}
      </AppLink>
    ),
  },
  { key: 'set', header: text.setColumn, stacked: '', className: 'lg:w-32', cell: ({ setName }) => setName },
  {
    key: 'lines',
    header: text.lines,
    stacked: '',
    className: 'lg:w-28',
    cell: ({ lines }) => (
      <>
        {lines}
        <span className="text-ink-2 lg:hidden"> {text.lines}</span>
      </>
    ),
  },
  {
    key: 'at',
    header: text.broughtIn,
    stacked: 'text-ink-2 lg:text-ink',
    className: 'lg:w-56',
    cell: ({ createdAt }) => <Instant at={createdAt} time />,
  },
];

const OUTCOME: LedgerColumn<Draft> = {
  key: 'outcome',
  header: text.outcome,
  stacked: '',
  className: 'lg:w-40',
  cell: ({ state, setKey, editionNumber }) =>
    state === 'published' && editionNumber !== null ? (
      <TextLink href={`/catalogue/${setKey}/editions/${editionNumber}`}>
        {text.published(editionNumber)}
      </TextLink>
    ) : (
      <span className="text-ink-2">{text.discarded}</span>
    ),
};

/** Files brought in, each leading to its lines; closed ones say what became of them. */
export function DraftTable({
  caption,
  drafts,
  closed,
}: {
  caption: string;
  drafts: readonly Draft[];
  closed: boolean;
}) {
  return (
    <LedgerTable
      caption={caption}
      columns={closed ? [...COLUMNS, OUTCOME] : COLUMNS}
      rows={drafts}
      rowKey={({ draftId }) => draftId}
      stackedRow="grid-cols-[minmax(0,1fr)_minmax(0,1fr)]"
    />
  );
}
