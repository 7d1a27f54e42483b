import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { AlgorithmText, AppLink, EmptyState, FlatView, Section, TextLink } from '#renderer/ui/index.ts';
import type { SearchInput, SearchView } from '#shared/contracts/catalogue-search.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueSearchText } from '#shared/text/catalogue-search.ts';
import { caseHref } from '../case-href.ts';
import { MovesResult } from './moves-result.tsx';

const text = catalogueSearchText;

/** What was found for the words of the box: what they do as moves, and which cases are called so. */
export function SearchResults({ input }: { input: SearchInput }) {
  const query = useCall(endpoints.catalogueSearch, input);
  return (
    <Awaited query={query}>
      {({ q, moves, names, more }) => (
        <div className="flex flex-col gap-9">
          <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
            <h2 className="min-w-0 break-words text-xl font-bold">{text.title(q)}</h2>
            <TextLink href="/catalogue" className="inline-flex min-h-12 items-center">
              {text.back}
            </TextLink>
          </div>
          {moves && <MovesResult q={q} moves={moves} />}
          {names.length > 0 && <Names names={names} more={more} />}
          {!moves && names.length === 0 && <EmptyState title={text.nothing} />}
        </div>
      )}
    </Awaited>
  );
}

function Names({ names, more }: Pick<SearchView, 'names' | 'more'>) {
  return (
    <Section title={text.names} ruled>
      <ul className="sm:grid sm:grid-cols-2 sm:gap-x-10 lg:grid-cols-3">
        {names.map(({ set, case: of, algorithm }) => (
          <li key={`${set.setKey} ${of.key}`} className="border-b border-hair">
            <AppLink
              href={caseHref(of.setKey, of.key)}
              className="group flex min-h-18 items-center gap-4 py-2"
            >
              <FlatView {...of.picture} className="w-14 shrink-0" />
              <span className="min-w-0">
                <span className="link font-bold group-hover:decoration-2">{`${set.name} ${of.name}`}</span>{' '}
                {of.alias !== null && <span className="ps-1">{of.alias}</span>}
                <span className="block break-words text-sm text-ink-2">
                  {algorithm === null ? of.group : <AlgorithmText text={algorithm} />}
                </span>
              </span>
            </AppLink>
          </li>
        ))}
      </ul>
      {more > 0 && <p className="pt-3 text-ink-2">{text.more(more)}</p>}
    </Section>
  );
}
