import { FigureBar, Section } from '#renderer/ui/index.ts';
import type { StandingsView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';

const text = deskText.standings;
const { percent } = numberText;

/** Boards between clubs: figures of teams, the own one marked. */
export function SharedBoards({ boards }: { boards: StandingsView['sharedBoards'] }) {
  return (
    <Section title={text.shared} ruled>
      {boards.length === 0 ? (
        <p className="py-3 text-ink-2">{text.noShared}</p>
      ) : (
        <>
          {boards.map((board) => (
            <section key={`${board.name} ${board.setName}`} className="pt-3">
              <h3 className="text-ink-2">{text.sharedCaption(board.name, board.setName)}</h3>
              {board.rows.length === 0 ? (
                <p className="py-3 text-ink-2">{text.noTeams}</p>
              ) : (
                <ol>
                  {board.rows.map((row) => (
                    <li key={row.club} className="border-b border-hair py-2">
                      <p className="flex items-baseline justify-between gap-4">
                        <span className={row.isMine ? 'font-bold' : ''}>{row.club}</span>
                        <span className="font-bold">{percent(row.value, 1)}</span>
                      </p>
                      <FigureBar
                        bare
                        figure={row}
                        text=""
                        label={text.teamLabel(percent(row.value), percent(row.low), percent(row.high))}
                      />
                      <p className="text-sm text-ink-2">
                        {row.isMine ? `${text.mine}, ${text.team(row.members)}` : text.team(row.members)}
                      </p>
                    </li>
                  ))}
                </ol>
              )}
            </section>
          ))}
          <p className="mt-3 text-sm text-ink-2">{text.sharedLead}</p>
        </>
      )}
    </Section>
  );
}
