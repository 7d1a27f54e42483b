import { FigureBar, Section, TextLink } from '#renderer/ui/index.ts';
import type { StandingsBoard } from '#shared/contracts/member.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';
import { sayFigure } from '../say-figure.ts';

const text = deskText.squad;
const SHOWN = 5;

/** The head of a board, with the way to all of it. */
export function ShortBoard({ board }: { board: StandingsBoard }) {
  return (
    <Section
      title={text.board(board.name, board.edition)}
      ruled
      aside={
        <TextLink href={`/desk/standings?${new URLSearchParams({ setKey: board.setKey })}`}>
          {text.wholeBoard}
        </TextLink>
      }
    >
      {board.rows.length === 0 ? (
        <p className="py-3 text-ink-2">{text.boardEmpty}</p>
      ) : (
        <ol>
          {board.rows.slice(0, SHOWN).map((row) => (
            <li
              key={row.nickname}
              className="grid grid-cols-[1.5rem_5.5rem_minmax(0,1fr)_auto] items-center gap-x-3 border-b border-hair py-2"
            >
              <span className="text-ink-2">{row.rank}</span>
              <span className="truncate font-bold">{row.nickname}</span>
              <FigureBar
                bare
                figure={row.figure}
                text=""
                label={sayFigure(row.figure)}
                hollow={row.figure.few}
              />
              <span aria-hidden="true" className="font-bold">
                {numberText.percent(row.figure.value, 1)}
              </span>
            </li>
          ))}
        </ol>
      )}
    </Section>
  );
}
