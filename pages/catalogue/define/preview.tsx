import type { UseQueryResult } from '@tanstack/react-query';
import type { ApiError } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { BigNumber, BigNumbers, type Column, DataTable, Notice, Section } from '#renderer/ui/index.ts';
import type { SetPreview } from '#shared/contracts/case-sets.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { setMakingText } from '#shared/text/set-making.ts';

const text = setMakingText.define;
type Class = NonNullable<SetPreview['counts']>['classes'][number];

const COLUMNS: readonly Column<Class>[] = [
  {
    key: 'cases',
    header: text.columns.cases,
    align: 'end',
    rowHeader: true,
    cell: (row) => text.whole(row.cases),
  },
  { key: 'angles', header: text.columns.angles, align: 'end', cell: (row) => row.angles },
  {
    key: 'prior',
    header: text.columns.prior,
    align: 'end',
    nowrap: true,
    cell: ({ prior }) => text.fraction(prior),
  },
  {
    key: 'dealt',
    header: text.columns.dealt,
    align: 'end',
    cell: ({ prior }) => text.once(prior.weight, prior.total),
  },
];

/** What the definition comes to, counted as it is changed. */
export function Preview({ query, mixed }: { query: UseQueryResult<SetPreview, ApiError>; mixed: boolean }) {
  return (
    <Section title={text.preview} ruled>
      <div aria-live="polite" aria-busy={query.isFetching} className="pt-4">
        <Awaited query={query} loading={text.counting}>
          {(preview) => <Counted preview={preview} mixed={mixed} />}
        </Awaited>
      </div>
    </Section>
  );
}

function Counted({
  preview: { problem, counts, like, algorithmsFrom },
  mixed,
}: {
  preview: SetPreview;
  mixed: boolean;
}) {
  return (
    <div className="grid gap-5">
      {problem !== null && (
        <Notice tone="ochre" title={text.cannot}>
          <p>{problem}</p>
        </Notice>
      )}
      {counts && (
        <>
          <BigNumbers>
            <BigNumber value={text.whole(counts.cases)} label={text.cases(counts.cases)} />
            <BigNumber tone="quiet" value={text.whole(counts.states)} label={text.states} />
            <BigNumber tone="quiet" value={text.fraction(counts.skip)} label={text.skip} />
          </BigNumbers>
          <div className="text-ink-2">
            {mixed && <p>{text.meet(catalogueText.sets.entry(counts.entry))}</p>}
            {like !== null && <p>{text.like(like)}</p>}
            {problem === null && (
              <p>{algorithmsFrom === null ? text.ownAlgorithms : text.algorithmsFrom(algorithmsFrom.name)}</p>
            )}
          </div>
          <DataTable
            caption={text.classes}
            columns={COLUMNS}
            rows={counts.classes}
            rowKey={({ angles, prior }) => `${angles} ${prior.weight}`}
            density="tight"
          />
        </>
      )}
    </div>
  );
}
