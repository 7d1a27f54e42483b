import { useLocation, useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { downloadCsv } from '#renderer/csv.ts';
import { useSession } from '#renderer/session.tsx';
import { Button, LinkButton, Notice, PageTitle } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import { SearchBox } from '../search/search-box.tsx';
import { searchInput } from '../search/search-input.ts';
import { SearchResults } from '../search/search-results.tsx';
import { setsCsv } from './sets-csv.ts';
import { SetsTable } from './sets-table.tsx';

const text = catalogueText.sets;

/** The catalogue's first page: every case set, and the ways to what can be done with them. */
export function SetsPage() {
  const { role } = useSession();
  const query = useCall(endpoints.catalogue, {});
  const [search] = useSearchParams();
  const sought = searchInput(search.get('q'));
  const retired = retiredIn(useLocation().state);
  return (
    <>
      <PageTitle title={text.title} lead={text.lead}>
        <LinkButton kind="outlined" href="/catalogue/draw">
          {drawingText.toDrawing}
        </LinkButton>
        {query.data && (
          <Button
            kind="outlined"
            onClick={() => query.data && downloadCsv(text.csvFile, setsCsv(query.data.sets))}
          >
            {text.csv}
          </Button>
        )}
        {role !== 'member' && (
          <LinkButton kind="outlined" href="/catalogue/new">
            {setMakingText.define.link}
          </LinkButton>
        )}
        {role === 'administrator' && (
          <LinkButton kind="outlined" href="/admin/intake">
            {text.toIntake}
          </LinkButton>
        )}
      </PageTitle>
      {retired !== null && (
        <div className="pb-5">
          <Notice title={text.retired(retired)} live />
        </div>
      )}
      <SearchBox q={sought?.q ?? ''} />
      {sought ? (
        <SearchResults input={sought} />
      ) : (
        <Awaited query={query}>{({ sets }) => <SetsTable sets={sets} />}</Awaited>
      )}
    </>
  );
}

/** The name of the set that was retired just before this page was come to. */
function retiredIn(state: unknown): string | null {
  const named = typeof state === 'object' && state !== null && 'retired' in state ? state.retired : null;
  return typeof named === 'string' ? named : null;
}
