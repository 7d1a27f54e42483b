import { FlatView, Section } from '#renderer/ui/index.ts';
import type { SquadView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.squad;

/** The cases the squad loses most solves to, with what is behind each. */
export function LostList({ lost, manySets }: { lost: SquadView['lost']; manySets: boolean }) {
  return (
    <Section title={text.lost} ruled>
      {lost.length === 0 ? (
        <p className="py-3 text-ink-2">{text.lostNone}</p>
      ) : (
        <>
          <ol>
            {lost.map((one) => (
              <li
                key={one.key}
                className="grid grid-cols-[3.5rem_minmax(0,1fr)_auto] items-center gap-x-4 border-b border-hair py-2"
              >
                <FlatView
                  stickers={one.picture.stickers}
                  colouring={one.picture.colouring}
                  className="w-14"
                />
                <div className="leading-snug">
                  <p className="font-bold">
                    {manySets && <span className="pe-1.5 text-sm font-normal text-ink-2">{one.setName}</span>}
                    {one.name}
                    {one.tradeName && (
                      <span className="ps-1.5 text-sm font-normal text-ink-2">{one.tradeName}</span>
                    )}
                  </p>
                  <p className="text-[0.9375rem] text-ink-2">{one.mostly}</p>
                </div>
                <p className="font-bold">{text.lostShare(one.share)}</p>
              </li>
            ))}
          </ol>
          <p className="mt-2 text-sm text-ink-2">{text.lostLead}</p>
        </>
      )}
    </Section>
  );
}
