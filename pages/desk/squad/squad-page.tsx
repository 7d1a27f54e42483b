import { useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { downloadCsv } from '#renderer/csv.ts';
import { Button, EmptyState, LinkButton, PageTitle } from '#renderer/ui/index.ts';
import type { SquadView } from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import { Chooser } from '../chooser.tsx';
import { LostList } from './lost-list.tsx';
import { ShortBoard } from './short-board.tsx';
import { squadCsv } from './squad-csv.ts';
import { sortOf, sortRows } from './squad-sort.ts';
import { SquadTable } from './squad-table.tsx';

const text = deskText.squad;

/** From this many columns on the grid takes the page's whole width. */
const WIDE = 6;
const TWO_PARTS = 'grid grid-cols-[minmax(0,1fr)] gap-10 lg:grid-cols-[minmax(0,1fr)_20rem] xl:gap-14';

/** What the screen at an address reads. */
export function squadInput(setKey: string | null | undefined): { setKey?: string } {
  return setKey ? { setKey } : {};
}

export function SquadPage() {
  const [search] = useSearchParams();
  const query = useCall(endpoints.squad, squadInput(search.get('setKey')));
  return <Awaited query={query}>{(view) => <Squad view={view} search={search} />}</Awaited>;
}

function Squad({ view, search }: { view: SquadView; search: URLSearchParams }) {
  const sort = sortOf(view, search);
  const rows = sortRows(view, sort);
  const chosen = view.sets.find(({ setKey }) => setKey === view.setKey);
  const wide = view.columns.length > WIDE;
  return (
    <>
      <PageTitle
        title={chosen ? text.titleOfGroups(chosen.name) : text.title}
        lead={
          <>
            {text.lead(chosen ? text.limit(chosen.limitMs) : null)} {text.key}
          </>
        }
      >
        <Button
          kind="outlined"
          size="small"
          onClick={() => downloadCsv(text.csvFile(view.setKey, view.date), squadCsv(view, rows))}
        >
          {text.csv}
        </Button>
      </PageTitle>
      {view.sets.length === 0 ? (
        <EmptyState title={text.noProgramme}>
          <p>{text.noProgrammeLead}</p>
          <p className="mt-4">
            <LinkButton href="/desk/programme">{text.toProgramme}</LinkButton>
          </p>
        </EmptyState>
      ) : (
        <>
          <Chooser
            label={text.view}
            choices={[
              { href: '/desk/squad', label: text.allSets, current: !chosen },
              ...view.sets.map(({ setKey, name }) => ({
                href: `/desk/squad?${new URLSearchParams({ setKey })}`,
                label: name,
                current: setKey === view.setKey,
              })),
            ]}
          />
          <div className={wide ? 'grid grid-cols-[minmax(0,1fr)] gap-10' : TWO_PARTS}>
            <SquadTable view={view} rows={rows} sort={sort} />
            <div
              className={
                wide
                  ? 'grid items-start gap-10 md:grid-cols-2 xl:gap-14'
                  : 'grid grid-cols-[minmax(0,1fr)] content-start gap-10'
              }
            >
              <LostList lost={view.lost} manySets={view.setKey === null && view.sets.length > 1} />
              {view.board && <ShortBoard board={view.board} />}
            </div>
          </div>
        </>
      )}
    </>
  );
}
