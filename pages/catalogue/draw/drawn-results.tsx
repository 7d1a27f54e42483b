import { AppLink, FlatView, Section } from '#renderer/ui/index.ts';
import type { DrawnView } from '#shared/contracts/catalogue-search.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { caseHref } from '../case-href.ts';

const text = drawingText;

/** The cases that look like the drawing, set by set, each turned to lie as it was drawn. */
export function DrawnResults({ sets }: Pick<DrawnView, 'sets'>) {
  if (sets.length === 0) return <p className="text-ink-2">{text.noSet}</p>;
  return (
    <div className="flex flex-col gap-9">
      {sets.map(({ set, cases, found, rows }) => (
        // The skip is looked for among the cases.
        <Section key={set.setKey} title={set.name} aside={text.found(found, cases + 1)} ruled>
          {rows.length === 0 ? (
            <p className="pt-3 text-ink-2">{text.none}</p>
          ) : (
            <ul className="grid grid-cols-3 gap-x-4 gap-y-5 pt-4 sm:grid-cols-5 xl:grid-cols-6">
              {rows.map(({ case: of, picture, states, of: all }) => (
                <li key={of.key}>
                  <AppLink href={caseHref(of.setKey, of.key)} className="group block">
                    <FlatView {...picture} className="w-full max-w-24" />
                    <span className="link block pt-1 font-bold group-hover:decoration-2">
                      {of.alias ?? of.name}
                    </span>
                    <span className="block text-sm text-ink-2">{text.share(states, all)}</span>
                  </AppLink>
                </li>
              ))}
            </ul>
          )}
          {found > rows.length && <p className="pt-4 text-ink-2">{text.more(found - rows.length)}</p>}
        </Section>
      ))}
    </div>
  );
}
