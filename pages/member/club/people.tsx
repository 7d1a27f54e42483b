import type { ClubView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';

const text = memberText.club;

/** Who is in the club: nicknames and roles, nothing else. */
export function People({ people }: { people: ClubView['people'] }) {
  return (
    <>
      <ul className="rule-t grid grid-cols-1 gap-x-10 sm:grid-cols-2">
        {people.map(({ nickname, role, isMe }) => (
          <li key={nickname} className="flex justify-between gap-4 border-b border-hair py-2">
            <span className={isMe ? 'font-bold' : undefined}>
              {nickname}
              {isMe && <span className="ms-2 font-normal text-ink-2">{text.you}</span>}
            </span>
            <span className="text-ink-2">{text.roles[role]}</span>
          </li>
        ))}
      </ul>
      <p className="max-w-[38rem] pt-3 text-sm text-ink-2">{text.peopleNote}</p>
    </>
  );
}
