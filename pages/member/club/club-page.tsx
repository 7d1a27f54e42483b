import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Section, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { memberText } from '#shared/text/member.ts';
import { pictureSettingsText } from '#shared/text/picture-settings.ts';
import { shellText } from '#shared/text/shell.ts';
import { PicturesForm } from '../../pictures/pictures-form.tsx';
import { MemberScreen } from '../screen.tsx';
import { Account } from './account.tsx';
import { Board } from './board.tsx';
import { People } from './people.tsx';
import { SettingsForm } from './settings-form.tsx';
import { SharedBoard } from './shared-board.tsx';

const text = memberText.club;

/** Club: standings, people, and what a member may set for themselves. */
export function ClubPage() {
  const query = useCall(endpoints.club, {});
  return (
    <MemberScreen title={text.title} aside={query.data?.name}>
      <Awaited query={query}>
        {(view) => (
          <div className="flex flex-col gap-10 pt-5">
            <Section title={text.boards}>
              {view.boards.length === 0 ? (
                <p className="text-ink-2">{text.noBoards}</p>
              ) : (
                <div className="flex flex-col gap-8">
                  <p className="max-w-[38rem] text-[0.9375rem] text-ink-2">
                    {text.boardsNote(view.boards[0]?.days ?? 0)}
                  </p>
                  {view.boards.map((board) => (
                    <Board key={board.setKey} board={board} />
                  ))}
                </div>
              )}
            </Section>
            <Section title={text.shared}>
              {view.sharedBoards.length === 0 ? (
                <p className="text-ink-2">{text.noShared}</p>
              ) : (
                <div className="flex flex-col gap-8">
                  <p className="text-[0.9375rem] text-ink-2">{text.sharedNote}</p>
                  {view.sharedBoards.map((board) => (
                    <SharedBoard key={board.name} board={board} />
                  ))}
                </div>
              )}
            </Section>
            <Section title={text.people}>
              <People people={view.people} />
            </Section>
            <Section title={text.settings}>
              <SettingsForm settings={view.settings} />
            </Section>
            <Section title={pictureSettingsText.title}>
              <p className="pb-4 text-[0.9375rem] text-ink-2">{pictureSettingsText.lead}</p>
              <PicturesForm cross={view.settings.crossColours} />
            </Section>
            <AlsoHere />
            <Section title={text.account}>
              <Account />
            </Section>
          </div>
        )}
      </Awaited>
    </MemberScreen>
  );
}

/** Places that the bar has and the thumb's row has no room for. */
function AlsoHere() {
  const places = [
    { href: '/catalogue', label: shellText.places.catalogue, note: text.alsoNote.catalogue },
    { href: '/ledger', label: shellText.places.ledger, note: text.alsoNote.ledger },
  ];
  return (
    <Section title={text.also} ruled className="lg:hidden">
      <ul>
        {places.map(({ href, label, note }) => (
          <li key={href} className="flex min-h-12 flex-wrap items-center gap-x-4 border-b border-hair py-2">
            <TextLink href={href} className="inline-flex min-h-8 items-center">
              {label}
            </TextLink>
            <span className="text-[0.9375rem] text-ink-2">{note}</span>
          </li>
        ))}
      </ul>
    </Section>
  );
}
