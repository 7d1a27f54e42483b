import { useEffect } from 'react';
import { useParams, useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Instant } from '#renderer/instant.tsx';
import { TextLink } from '#renderer/ui/index.ts';
import type { CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueSheetText } from '#shared/text/catalogue-sheet.ts';
import { shellText } from '#shared/text/shell.ts';
import { SheetCases } from './sheet-cases.tsx';
import { SheetChoices } from './sheet-choices.tsx';
import { lookOf, sheetInput } from './sheet-input.ts';

const text = catalogueSheetText;

/** The algorithms of a set on paper: A4, legible in greys, every picture with letters. */
export function SheetPage() {
  const { setKey = '' } = useParams();
  const [search] = useSearchParams();
  const words = Object.fromEntries(search);
  const query = useCall(endpoints.catalogueSheet, sheetInput(setKey, words), { keepWhileLoading: true });
  const title = query.data ? text.title(query.data.setName) : text.name;
  useEffect(() => {
    document.title = `${title} · ${shellText.product}`;
  }, [title]);
  return (
    <Awaited query={query}>
      {(view) => (
        <div className="print-pages">
          <p aria-hidden className="print-running">
            {text.running(view.setName, view.edition)}
          </p>
          <div className="print-body">
            <SheetHead view={view} />
            <SheetChoices view={view} />
            {view.groups.map(({ name, cases }) => (
              <section key={name} className="pt-5 print:grid print:grid-cols-2 print:gap-x-[6mm]">
                {name && (
                  <h2 className="rule-b pb-1 text-lg font-bold print:col-span-2">
                    {name}
                    <span className="ps-3 text-sm font-normal text-ink-2">{text.cases(cases.length)}</span>
                  </h2>
                )}
                <SheetCases setKey={setKey} cases={cases} look={lookOf(words)} />
              </section>
            ))}
          </div>
        </div>
      )}
    </Awaited>
  );
}

function SheetHead({ view }: { view: CatalogueSheetView }) {
  const cases = view.groups.reduce((sum, group) => sum + group.cases.length, 0);
  return (
    <header className="pt-6 print:pt-0">
      <p className="screen-only">
        <TextLink href={`/catalogue/${view.setKey}`} className="inline-flex min-h-12 items-center">
          {text.back(view.setName)}
        </TextLink>
      </p>
      <h1 className="text-[1.75rem] font-bold tracking-[-0.01em] sm:text-[2rem] print:text-[18pt]">
        {text.title(view.setName)}
      </h1>
      <p className="mt-1 text-ink-2">
        {text.edition(view.edition)}, <Instant at={view.publishedAt} />; {text.cases(cases)}. {text.holding}
      </p>
    </header>
  );
}
