import { useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { EmptyState, LinkButton, PageTitle, Section } from '#renderer/ui/index.ts';
import type { StandingsView } from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import { Chooser } from '../chooser.tsx';
import { BoardTable } from './board-table.tsx';
import { SharedBoards } from './shared-boards.tsx';

const text = deskText.standings;

/** What the screen at an address reads. */
export function standingsInput(setKey: string | null | undefined): { setKey?: string } {
  return setKey ? { setKey } : {};
}

export function StandingsPage() {
  const [search] = useSearchParams();
  const query = useCall(endpoints.standings, standingsInput(search.get('setKey')));
  return <Awaited query={query}>{(view) => <Standings view={view} />}</Awaited>;
}

function Standings({ view: { sets, board, notOptedIn, sharedBoards } }: { view: StandingsView }) {
  return (
    <>
      <PageTitle
        title={board ? text.titleOf(board.name) : text.title}
        lead={board ? text.lead(board.days) : undefined}
      />
      {board === null ? (
        <EmptyState title={text.none}>
          <p>
            <LinkButton href="/desk/programme">{deskText.squad.toProgramme}</LinkButton>
          </p>
        </EmptyState>
      ) : (
        <>
          <Chooser
            label={text.sets}
            choices={sets.map(({ setKey, name }) => ({
              href: `/desk/standings?${new URLSearchParams({ setKey })}`,
              label: name,
              current: setKey === board.setKey,
            }))}
          />
          <div className="grid grid-cols-[minmax(0,1fr)] gap-10 lg:grid-cols-[minmax(0,1fr)_22rem] xl:gap-14">
            <Section title={text.inClub} aside={text.conditions(board.edition, board.limitMs)}>
              <BoardTable board={board} />
              <p className="mt-4 max-w-[38rem] text-ink-2">
                {notOptedIn === 0 ? text.allOptedIn : `${text.notOptedIn(notOptedIn)} ${text.optInHow}`}
              </p>
            </Section>
            <SharedBoards boards={sharedBoards} />
          </div>
        </>
      )}
    </>
  );
}
