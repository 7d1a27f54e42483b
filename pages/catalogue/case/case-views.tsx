import { FlatView, SeatView, Section } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';

const text = catalogueCaseText;

/** Every really different angle as it is seen from the seat and from above. */
export function CaseViews({ view: { views, algorithms } }: { view: CatalogueCaseView }) {
  const first = algorithms[0];
  return (
    <Section title={text.views.title}>
      <p className="pb-4 text-ink-2">{text.views.note(views.length, first !== undefined)}</p>
      <ul className="grid grid-cols-2 gap-x-5 gap-y-6 sm:grid-cols-4">
        {views.map(({ stickers, colouring }, at) => (
          <li key={Object.values(stickers).join(' ')}>
            <figure>
              <SeatView stickers={stickers} colouring={colouring} holding="right" />
              <figcaption className="flex items-center gap-3 pt-3">
                <FlatView stickers={stickers} colouring={colouring} className="w-16 shrink-0 sm:w-18" />
                <span className="min-w-0 leading-snug">
                  <span className="font-bold">{text.views.view(at + 1)}</span>
                  {first && (
                    <span className="block text-[0.9375rem] text-ink-2">
                      {text.views.auf(first.rightAufs[at] ?? [])}
                    </span>
                  )}
                </span>
              </figcaption>
            </figure>
          </li>
        ))}
      </ul>
    </Section>
  );
}
