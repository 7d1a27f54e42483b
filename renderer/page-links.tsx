import { shellText } from '#shared/text/shell.ts';
import { TextLink } from './ui/index.ts';

/** The part of a long list that a page number shows; numbers outside the list mean its nearest end. */
export function pageOf<T>(
  rows: readonly T[],
  size: number,
  wanted: number,
): { rows: T[]; page: number; of: number } {
  const of = Math.max(1, Math.ceil(rows.length / size));
  const page = Math.min(of, Math.max(1, Number.isInteger(wanted) ? wanted : 1));
  return { rows: rows.slice((page - 1) * size, page * size), page, of };
}

/** Ways to the pages before and after; nothing where all fits on one. */
export function PageLinks({
  page,
  of,
  hrefOf,
}: {
  page: number;
  of: number;
  hrefOf: (page: number) => string;
}) {
  if (of === 1) return null;
  return (
    <nav aria-label={shellText.pages.label} className="flex flex-wrap items-center gap-x-6 py-4">
      <span className="text-ink-2">{shellText.pages.at(page, of)}</span>
      {page > 1 && (
        <TextLink href={hrefOf(page - 1)} className="inline-flex min-h-12 items-center">
          {shellText.pages.previous}
        </TextLink>
      )}
      {page < of && (
        <TextLink href={hrefOf(page + 1)} className="inline-flex min-h-12 items-center">
          {shellText.pages.next}
        </TextLink>
      )}
    </nav>
  );
}
