import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Instant } from '#renderer/instant.tsx';
import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { useSession } from '#renderer/session.tsx';
import { LinkButton, PageTitle, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueView } from '#shared/contracts/catalogue.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueText } from '#shared/text/catalogue.ts';

type SetRow = CatalogueView['sets'][number];
const text = catalogueText.sets;

/** A cell whose header stands before it where the table has fallen into stacks. */
function Labelled({ label, children }: { label: string; children: string }) {
  return (
    <>
      <span className="text-ink-2 lg:hidden">{label} </span>
      {children}
    </>
  );
}

const COLUMNS: readonly LedgerColumn<SetRow>[] = [
  {
    key: 'set',
    header: text.columns.set,
    rowHeader: true,
    className: 'lg:w-28 align-top',
    stacked: '',
    cell: ({ setKey, name }) => (
      <TextLink href={`/catalogue/${setKey}`} className="text-xl leading-6">
        {name}
      </TextLink>
    ),
  },
  {
    key: 'entry',
    header: text.columns.entry,
    className: 'align-top',
    stacked: 'col-span-2',
    cell: ({ entry }) => <Labelled label={text.columns.entry}>{text.entry(entry)}</Labelled>,
  },
  {
    key: 'toldApart',
    header: text.columns.toldApart,
    className: 'align-top',
    stacked: 'col-span-2',
    cell: ({ toldApart }) => <Labelled label={text.columns.toldApart}>{text.aspects(toldApart)}</Labelled>,
  },
  {
    key: 'solved',
    header: text.columns.solved,
    className: 'align-top',
    stacked: 'col-span-2',
    cell: ({ solved }) => <Labelled label={text.columns.solved}>{text.aspects(solved)}</Labelled>,
  },
  {
    key: 'cases',
    header: text.columns.cases,
    className: 'lg:w-20 align-top lg:text-end lg:pe-8!',
    stacked: 'col-start-2 row-start-1 text-end',
    cell: ({ cases }) => (
      <>
        {cases.toLocaleString('en-GB')}
        <span className="text-ink-2 lg:hidden"> {text.columns.cases}</span>
      </>
    ),
  },
  {
    key: 'editions',
    header: text.columns.editions,
    className: 'lg:w-[21rem] align-top',
    stacked: 'col-span-2 mt-1 lg:mt-0',
    cell: (set) => <Editions set={set} />,
  },
];

function Editions({ set: { setKey, editions } }: { set: SetRow }) {
  const [newest, ...earlier] = editions;
  if (!newest) return <span className="text-ink-2">{text.noEdition}</span>;
  const href = (number: number) => `/catalogue/${setKey}/editions/${number}`;
  return (
    <>
      <p>
        <TextLink
          href={href(newest.number)}
          className="font-bold max-lg:inline-flex max-lg:min-h-12 max-lg:items-center"
        >
          {text.edition(newest.number)}
        </TextLink>
        <span className="ps-3 text-ink-2">
          <Instant at={newest.publishedAt} />
        </span>
      </p>
      <p className="text-[0.9375rem] text-ink-2">{text.editionSize(newest.cases, newest.algorithms)}</p>
      {newest.note && <p className="break-words text-[0.9375rem] text-ink-2">{newest.note}</p>}
      {earlier.length > 0 && (
        <p className="mt-1 flex flex-wrap items-baseline gap-x-3 text-[0.9375rem] text-ink-2">
          {text.earlier}
          {earlier.map(({ number }) => (
            <TextLink
              key={number}
              href={href(number)}
              className="max-lg:inline-flex max-lg:min-h-12 max-lg:items-center"
            >
              {String(number)}
            </TextLink>
          ))}
        </p>
      )}
    </>
  );
}

/** Every case set in words, with the editions published of it. */
export function SetsPage() {
  const { role } = useSession();
  const query = useCall(endpoints.catalogue, {});
  return (
    <>
      <PageTitle title={text.title} lead={text.lead}>
        {role === 'administrator' && (
          <LinkButton kind="outlined" href="/admin/intake">
            {text.toIntake}
          </LinkButton>
        )}
      </PageTitle>
      <Awaited query={query}>
        {({ sets }) => (
          <LedgerTable
            caption={text.caption}
            columns={COLUMNS}
            rows={sets}
            rowKey={({ setKey }) => setKey}
            stackedRow="grid-cols-[minmax(0,1fr)_auto]"
          />
        )}
      </Awaited>
    </>
  );
}
