import { useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Button, EmptyState, FigureBar, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { MyCasesView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { MemberScreen } from '../screen.tsx';
import { CaseFilters } from './case-filters.tsx';
import { CaseList } from './case-list.tsx';
import { CaseTable } from './case-table.tsx';
import { type CaseFilter, filterCases, readFilter, writeFilter } from './filter-cases.ts';

const text = memberText.cases;

/** My cases: everything the member answers for, to be searched, sorted and linked to. */
export function CasesPage() {
  const query = useCall(endpoints.myCases, {});
  const [search, setSearch] = useSearchParams();
  const filter = readFilter(search);
  const change = (part: Partial<CaseFilter>) =>
    setSearch(writeFilter({ ...filter, ...part }), { replace: true, preventScrollReset: true });
  const shown = query.data ? filterCases(query.data.cases, filter) : [];
  const aside = query.data ? text.count(shown.length, query.data.cases.length) : undefined;
  return (
    <MemberScreen title={text.title} aside={aside} wide>
      {/* The bar has it where there is room for a bar. */}
      <p className="screen-only lg:hidden">
        <TextLink href="/catalogue" className="inline-flex min-h-12 items-center">
          {text.toCatalogue}
        </TextLink>
      </p>
      <Awaited query={query}>
        {(view) =>
          view.sets.length === 0 ? (
            <div className="pt-6">
              <EmptyState title={memberText.noSets.title}>
                <p>{memberText.noSets.detail}</p>
              </EmptyState>
            </div>
          ) : (
            <>
              <SetFigures sets={view.sets} />
              <CaseFilters sets={view.sets} filter={filter} onChange={change} />
              {shown.length === 0 ? (
                <div className="flex flex-wrap items-center gap-4 py-8">
                  <p>{text.none}</p>
                  <Button
                    kind="outlined"
                    onClick={() => change({ set: '', state: '', text: '', sort: filter.sort })}
                  >
                    {text.clear}
                  </Button>
                </div>
              ) : (
                <>
                  <div className="lg:hidden">
                    <CaseList cases={shown} today={view.date} />
                  </div>
                  <div className="hidden lg:block">
                    <CaseTable
                      cases={shown}
                      today={view.date}
                      sort={filter.sort}
                      onSort={(sort) => change({ sort })}
                    />
                  </div>
                </>
              )}
            </>
          )
        }
      </Awaited>
    </MemberScreen>
  );
}

function SetFigures({ sets }: { sets: MyCasesView['sets'] }) {
  return (
    <ul className="grid max-w-[28rem] grid-cols-2 gap-x-6 gap-y-3 pt-4">
      {sets.map(({ setKey, name, recall }) => (
        <li key={setKey}>
          <span className="flex justify-between gap-2 text-[0.9375rem]">
            <span className="font-bold">{name}</span>
            <span className="text-ink-2">{text.setRecall}</span>
          </span>
          <FigureBar
            figure={recall.rests === 'nothing' ? null : recall}
            text={memberText.figure(recall)}
            label={memberText.figureLabel(recall)}
            hollow={recall.few}
            strong
          />
        </li>
      ))}
    </ul>
  );
}
