import { AlgorithmText, AppLink, FlatView, VisuallyHidden } from '#renderer/ui/index.ts';
import type { CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { PALETTES } from '#shared/lastlayer/pictures/index.ts';
import { catalogueSheetText } from '#shared/text/catalogue-sheet.ts';
import { numberText } from '#shared/text/numbers.ts';
import { caseHref } from '../case-href.ts';
import type { SheetLook } from './sheet-input.ts';

type SheetCase = CatalogueSheetView['groups'][number]['cases'][number];

/**
 * Cases in two columns, none broken over the edge of a page. On paper they are laid out by the section they stand
 * in, as one grid with its heading: so the heading keeps to the first of them.
 */
export function SheetCases({
  setKey,
  cases,
  look,
}: {
  setKey: string;
  cases: readonly SheetCase[];
  look: SheetLook;
}) {
  return (
    <ul className="grid gap-x-8 lg:grid-cols-2 print:contents">
      {cases.map((one) => (
        <li
          key={one.key}
          className="keep-together flex items-start gap-4 border-b border-hair py-2 print:gap-[4mm] print:py-[1.5mm]"
        >
          <FlatView
            stickers={one.picture.stickers}
            colouring={one.picture.colouring}
            {...(look.colours ? {} : { palette: PALETTES.greys })}
            letters
            className="w-20 shrink-0 print:w-[29mm]"
          />
          <div className="min-w-0 flex-1">
            <p className="flex flex-wrap items-baseline justify-between gap-x-4">
              <AppLink
                href={caseHref(setKey, one.key)}
                className="inline-flex min-h-12 items-center text-lg font-bold hover:underline lg:min-h-0 print:min-h-0"
              >
                {one.alias ?? one.name}
              </AppLink>
              {one.alias !== null && <span className="text-ink-2">{one.name}</span>}
              <span className="ms-auto text-sm text-ink-2">{numberText.fraction(one.prior)}</span>
            </p>
            <ol>
              {(look.first ? one.algorithms.slice(0, 1) : one.algorithms).map(({ algorithm, auf }) => (
                <li
                  key={algorithm}
                  className="grid grid-cols-[2rem_minmax(0,1fr)] text-ink-2 first:text-ink print:grid-cols-[7mm_minmax(0,1fr)] print:text-[9.5pt] print:leading-snug print:text-ink"
                >
                  <Auf turns={auf} />
                  <AlgorithmText text={algorithm} className="col-start-2 break-words" />
                </li>
              ))}
            </ol>
          </div>
        </li>
      ))}
    </ul>
  );
}

/** The AUF before an algorithm, set apart; nothing where none is needed. */
function Auf({ turns }: { turns: number }) {
  if (turns === 0) return null;
  return (
    <span translate="no">
      <span aria-hidden className="font-bold">
        {catalogueSheetText.auf(turns)}
      </span>
      <VisuallyHidden>{catalogueSheetText.aufSpoken(turns)} </VisuallyHidden>
    </span>
  );
}
