import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { AlgorithmText, Section, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { aufText } from '#shared/text/auf.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';

type Row = CatalogueCaseView['algorithms'][number];
const text = catalogueCaseText.algorithms;

const METRICS = ['htm', 'qtm', 'stm', 'etm'] as const;

/** What solves it: each algorithm with its counts and, for every view, the AUFs before that are right. */
export function Algorithms({ view }: { view: CatalogueCaseView }) {
  const { setKey, edition, algorithms, views, case: c } = view;
  if (algorithms.length === 0) {
    return (
      <Section title={text.title} ruled>
        <p className="py-3 text-ink-2">{c.skip ? text.noneForSkip : text.none}</p>
      </Section>
    );
  }
  return (
    <Section
      title={text.title}
      aside={
        edition !== null && (
          <TextLink
            href={`/catalogue/${setKey}/editions/${edition}`}
            className="inline-flex min-h-12 items-center lg:min-h-6"
          >
            {text.edition(edition)}
          </TextLink>
        )
      }
    >
      <LedgerTable
        caption={text.caption}
        columns={columnsFor(views.length)}
        rows={algorithms}
        rowKey={({ algorithm }) => algorithm}
        stackedRow="grid-cols-4 gap-y-1"
      />
    </Section>
  );
}

function columnsFor(views: number): readonly LedgerColumn<Row>[] {
  return [
    {
      key: 'algorithm',
      header: text.algorithm,
      rowHeader: true,
      stacked: 'col-span-4 pb-2 lg:pb-3',
      cell: ({ algorithm, note }) => (
        <>
          <AlgorithmText text={algorithm} className="break-words font-normal" />
          {note && <span className="block text-sm font-normal text-ink-2">{note}</span>}
        </>
      ),
    },
    ...METRICS.map(
      (metric): LedgerColumn<Row> => ({
        key: metric,
        header: text.counts[metric],
        className: 'lg:w-12 align-top',
        stacked: '',
        cell: ({ counts }) => <Labelled label={text.counts[metric]}>{String(counts[metric])}</Labelled>,
      }),
    ),
    ...Array.from(
      { length: views },
      (_, at): LedgerColumn<Row> => ({
        key: `auf-${at}`,
        header: text.auf(at + 1),
        className: 'lg:w-17 align-top',
        stacked: views === 1 ? 'col-span-4' : views === 2 ? 'col-span-2' : '',
        cell: ({ rightAufs }) => (
          <Labelled label={text.auf(at + 1)}>{aufText.anyOf(rightAufs[at] ?? [])}</Labelled>
        ),
      }),
    ),
  ];
}

/** A figure under its name where the table has fallen into stacks. */
function Labelled({ label, children }: { label: string; children: string }) {
  return (
    <>
      <span className="block text-sm text-ink-2 lg:hidden">{label}</span>
      {children}
    </>
  );
}
