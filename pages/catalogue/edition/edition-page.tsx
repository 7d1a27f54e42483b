import { useDeferredValue, useState } from 'react';
import { useLocation, useNavigate, useParams, useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { downloadCsv } from '#renderer/csv.ts';
import { Instant } from '#renderer/instant.tsx';
import { PageLinks, pageOf } from '#renderer/page-links.tsx';
import { queryHref } from '#renderer/query-href.ts';
import { AppLink, BigNumber, BigNumbers, Button, cx, TextField, TextLink } from '#renderer/ui/index.ts';
import type { EditionView } from '#shared/contracts/catalogue.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { CaseTable } from './case-table.tsx';
import { editionCsv } from './edition-csv.ts';
import { filterCases, sortCases, sortFrom, sortWord } from './sort-cases.ts';

const text = catalogueText.edition;
const CASES_ON_A_PAGE = 500;

/** One published edition: every case with its picture, prior and algorithms. */
export function EditionPage() {
  const { setKey = '', number = '' } = useParams();
  const query = useCall(endpoints.edition, { setKey, number: Number(number) });
  return (
    <Awaited query={query} loading={text.loading} failed={text.cannotLoad}>
      {(view) => (
        <>
          <EditionHead view={view} />
          <EditionCases key={`${view.setKey} ${view.number}`} view={view} />
        </>
      )}
    </Awaited>
  );
}

function EditionHead({ view }: { view: EditionView }) {
  const { setKey, setName, number, numbers, publishedAt, note, cases, missing } = view;
  const newest = Math.max(...numbers);
  const algorithms = cases.reduce((sum, c) => sum + c.algorithms.length, 0);
  return (
    <header className="pt-4">
      <TextLink href={`/catalogue/${setKey}`} className="inline-flex min-h-12 items-center text-[0.9375rem]">
        {setName}
      </TextLink>
      <h1 className="text-[1.75rem] font-bold tracking-[-0.01em] sm:text-[2rem]">
        {text.title(setName, number)}
      </h1>
      <p className="mt-2 text-ink-2">
        {text.published} <Instant at={publishedAt} />.{' '}
        {number === newest ? text.newest : text.notNewest(newest)}
      </p>
      {note && <p className="max-w-[46rem] whitespace-pre-line break-words text-ink-2">{note}</p>}
      {numbers.length > 1 && (
        <nav aria-label={text.others} className="flex flex-wrap items-center gap-x-4 pt-1">
          <span className="text-ink-2">{text.others}</span>
          {numbers.map((one) => (
            <AppLink
              key={one}
              href={`/catalogue/${setKey}/editions/${one}`}
              aria-current={one === number ? 'page' : undefined}
              className={cx(
                'inline-flex min-h-12 min-w-6 items-center justify-center lg:min-h-8',
                one === number ? 'font-bold' : 'link',
              )}
            >
              {text.number(one)}
            </AppLink>
          ))}
        </nav>
      )}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-5 pb-5 pt-5">
        <BigNumbers>
          <BigNumber
            tone="quiet"
            value={text.numbers.cases(cases.length, cases.length + missing.length)}
            label={`${text.numbers.casesLabel}${missing.length > 0 ? text.numbers.missing(missing) : ''}`}
          />
          <BigNumber tone="quiet" value={String(algorithms)} label={text.numbers.algorithms(algorithms)} />
        </BigNumbers>
        <Button kind="outlined" onClick={() => downloadCsv(text.csvFile(setKey, number), editionCsv(cases))}>
          {text.csv}
        </Button>
      </div>
    </header>
  );
}

function EditionCases({ view }: { view: EditionView }) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const navigate = useNavigate();
  const [words, setWords] = useState(search.get('q') ?? '');
  // Typing stays quick at hundreds of rows: the table follows when it can.
  const wanted = useDeferredValue(words);
  const order = sortFrom(search.get('sort'));
  const found = sortCases(filterCases(view.cases, wanted), order);
  const { rows, page, of } = pageOf(found, CASES_ON_A_PAGE, Number(search.get('page') ?? 1));
  const type = (next: string) => {
    setWords(next);
    void navigate(queryHref(search, pathname, { q: next.trim() === '' ? null : next, page: null }), {
      replace: true,
      preventScrollReset: true,
    });
  };
  return (
    <>
      <div className="screen-only flex flex-wrap items-end justify-between gap-x-8 gap-y-2 pb-4">
        <div className="w-full sm:w-80">
          <TextField
            id="case-filter"
            type="search"
            label={text.filter}
            placeholder={text.filterHint}
            value={words}
            maxLength={100}
            onChange={(event) => type(event.target.value)}
          />
        </div>
        <p role="status" className="text-ink-2">
          {text.shown(found.length, view.cases.length)}
        </p>
      </div>
      <CaseTable
        setKey={view.setKey}
        cases={rows}
        order={order}
        sortHref={(to) => queryHref(search, pathname, { sort: sortWord(to), page: null })}
        empty={text.none(wanted)}
      />
      <PageLinks
        page={page}
        of={of}
        hrefOf={(to) => queryHref(search, pathname, { page: to === 1 ? null : String(to) })}
      />
    </>
  );
}
