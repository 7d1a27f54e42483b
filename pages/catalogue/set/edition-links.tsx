import { useLocation, useSearchParams } from 'react-router';
import { Instant } from '#renderer/instant.tsx';
import { queryHref } from '#renderer/query-href.ts';
import { AppLink, cx, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { catalogueText } from '#shared/text/catalogue.ts';

const text = catalogueText.set;

/** The edition whose names and algorithms are shown, and the ways to the others. */
export function EditionLinks({ view: { setKey, edition, editions } }: { view: CatalogueSetView }) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const shown = editions.find(({ number }) => number === edition);
  if (!shown) return <p className="text-ink-2">{text.noEdition}</p>;
  const newest = editions[0]?.number;
  return (
    <div className="text-[0.9375rem] text-ink-2">
      <p>
        <TextLink
          href={`/catalogue/${setKey}/editions/${shown.number}`}
          className="inline-flex min-h-12 items-center lg:min-h-8"
        >
          {catalogueText.sets.edition(shown.number)}
        </TextLink>
        <span className="ps-3">
          <Instant at={shown.publishedAt} />
        </span>
      </p>
      {editions.length > 1 && (
        <nav aria-label={text.showIn} className="flex flex-wrap items-center gap-x-3">
          <span>{text.showIn}</span>
          {editions.map(({ number }) => (
            <AppLink
              key={number}
              href={queryHref(search, pathname, {
                edition: number === newest ? null : String(number),
                after: null,
                before: null,
              })}
              aria-current={number === edition ? 'page' : undefined}
              className={cx(
                'inline-flex min-h-12 min-w-6 items-center justify-center lg:min-h-8',
                number === edition ? 'font-bold text-ink' : 'link',
              )}
            >
              {String(number)}
            </AppLink>
          ))}
        </nav>
      )}
    </div>
  );
}
