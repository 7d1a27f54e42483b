import { useLocation, useSearchParams } from 'react-router';
import { Instant } from '#renderer/instant.tsx';
import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { queryHref } from '#renderer/query-href.ts';
import { useSession } from '#renderer/session.tsx';
import { TextLink } from '#renderer/ui/index.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { numberText } from '#shared/text/numbers.ts';
import { type SetRow, type SetSort, sortSets } from './sort-sets.ts';

const text = catalogueText.sets;

/** Every case set in words, with the editions published of it. */
export function SetsTable({ sets }: { sets: readonly SetRow[] }) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const order = search.get('sort');
  const sort = (by: SetSort) => ({
    direction:
      order === by
        ? ('ascending' as const)
        : order === `-${by}`
          ? ('descending' as const)
          : ('none' as const),
    // A third press brings the trade's own order back.
    href: queryHref(search, pathname, { sort: order === by ? `-${by}` : order === `-${by}` ? null : by }),
  });
  return (
    <LedgerTable
      caption={text.caption}
      columns={columnsWith(sort)}
      rows={sortSets(sets, order)}
      rowKey={({ setKey }) => setKey}
      stackedRow="grid-cols-[minmax(0,1fr)_auto]"
    />
  );
}

function columnsWith(sort: (by: SetSort) => LedgerColumn<SetRow>['sort']): readonly LedgerColumn<SetRow>[] {
  return [
    {
      key: 'set',
      header: text.columns.set,
      rowHeader: true,
      sort: sort('set'),
      className: 'lg:w-36 align-top',
      stacked: 'min-w-0',
      cell: (set) => <SetName set={set} />,
    },
    {
      key: 'entry',
      header: text.columns.entry,
      className: 'align-top',
      stacked: 'col-span-2',
      cell: ({ entry, mix }) => <Labelled label={text.columns.entry}>{text.entryOrMix(entry, mix)}</Labelled>,
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
      sort: sort('cases'),
      className: 'lg:w-20 align-top lg:text-end lg:pe-8!',
      stacked: 'col-start-2 row-start-1 self-center text-end',
      cell: ({ cases }) => (
        <>
          {numberText.whole(cases)}
          <span className="text-ink-2 lg:hidden"> {text.columns.cases}</span>
        </>
      ),
    },
    {
      key: 'editions',
      header: text.columns.editions,
      sort: sort('editions'),
      className: 'lg:w-[21rem] align-top',
      stacked: 'col-span-2 mt-1 lg:mt-0',
      cell: (set) => <Editions set={set} />,
    },
  ];
}

function SetName({ set: { setKey, name, ofClub, parent } }: { set: SetRow }) {
  // Two clubs may have sets of one name: whoever sees both sees their keys.
  const { role } = useSession();
  const own = ofClub ? text.ofClub(role === 'administrator' ? setKey : null) : '';
  const says = [own, parent ? text.madeOf(parent.name) : ''].filter(Boolean).join(', ');
  return (
    <>
      <TextLink
        href={`/catalogue/${setKey}`}
        className="break-words text-xl leading-6 max-lg:inline-flex max-lg:min-h-12 max-lg:items-center"
      >
        {name}
      </TextLink>
      {says && <span className="block text-sm font-normal text-ink-2">{says}</span>}
    </>
  );
}

/** A cell whose header stands before it where the table has fallen into stacks. */
function Labelled({ label, children }: { label: string; children: string }) {
  return (
    <>
      <span className="text-ink-2 lg:hidden">{label} </span>
      {children}
    </>
  );
}

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
