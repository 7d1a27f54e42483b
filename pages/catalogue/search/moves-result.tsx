import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { AlgorithmText, AppLink, FlatView, printedAlgorithm, Section, TextLink } from '#renderer/ui/index.ts';
import type { MovesFound, MovesHit } from '#shared/contracts/catalogue-search.ts';
import { catalogueSearchText } from '#shared/text/catalogue-search.ts';
import { caseHref } from '../case-href.ts';

type Row = Extract<MovesFound, { kind: 'read' }>['sets'][number];
const text = catalogueSearchText;

/** What the words do if they are moves: set by set, or what is wrong with them. */
export function MovesResult({ q, moves }: { q: string; moves: MovesFound }) {
  if (moves.kind === 'not-a-move') {
    const { column, token } = moves;
    return (
      <Section title={text.moves} ruled>
        <p className="pt-3 text-lg">
          <AlgorithmText text={q} wrong={{ column, length: Math.max(1, token.length) }} />
        </p>
        <p className="pt-1">{text.notAMove(token, column)}</p>
      </Section>
    );
  }
  return (
    <Section title={text.moves}>
      <p className="text-lg">
        <AlgorithmText text={moves.moves} className="break-words" />
      </p>
      {moves.kind === 'first-two-layers-broken' ? (
        <p className="pt-1">{text.broken(moves.pieces)}</p>
      ) : (
        <>
          <p className="pb-4 text-ink-2">{text.counts(moves.counts)}</p>
          {moves.sets.length === 0 ? (
            <p>{text.nothingDone}</p>
          ) : (
            <LedgerTable
              caption={text.caption}
              columns={COLUMNS}
              rows={moves.sets}
              rowKey={({ set }) => set.setKey}
              stackedRow="grid-cols-1 gap-y-2"
            />
          )}
        </>
      )}
    </Section>
  );
}

const COLUMNS: readonly LedgerColumn<Row>[] = [
  {
    key: 'set',
    header: text.columns.set,
    rowHeader: true,
    className: 'lg:w-28 align-top',
    stacked: '',
    cell: ({ set }) => <TextLink href={`/catalogue/${set.setKey}`}>{set.name}</TextLink>,
  },
  {
    key: 'solves',
    header: text.columns.solves,
    className: 'align-top lg:w-1/2',
    stacked: '',
    cell: ({ solves }) => <Hit label={text.columns.solves} hit={solves} />,
  },
  {
    key: 'leadsTo',
    header: text.columns.leadsTo,
    className: 'align-top',
    stacked: '',
    cell: ({ leadsTo }) => <Hit label={text.columns.leadsTo} hit={leadsTo} />,
  },
];

/** A case that was found, and how the catalogue's own algorithm takes it from there. */
function Hit({ label, hit }: { label: string; hit: MovesHit | null }) {
  const head = <span className="block text-sm text-ink-2 lg:hidden">{label}</span>;
  if (!hit || hit.case.skip)
    return (
      <span className="text-ink-2">
        {head}
        {hit ? text.skip : text.none}
      </span>
    );
  const { case: of, algorithm, aufs, known } = hit;
  return (
    <>
      {head}
      <AppLink href={caseHref(of.setKey, of.key)} className="group flex items-center gap-4">
        <FlatView {...of.picture} className="w-14 shrink-0" />
        <span className="min-w-0">
          <span className="link font-bold group-hover:decoration-2">{of.alias ?? of.name}</span>{' '}
          <span className="ps-1 text-sm text-ink-2">{of.alias === null ? of.group : of.name}</span>
          <span className="block break-words text-[0.9375rem] text-ink-2">
            {known
              ? text.known
              : algorithm === null
                ? text.noAlgorithm
                : text.auf(aufs, printedAlgorithm(algorithm))}
          </span>
        </span>
      </AppLink>
    </>
  );
}
