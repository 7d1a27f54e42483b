import { type ReactNode, useId } from 'react';
import { cx } from './cx.ts';
import { AppLink } from './link.tsx';

export type SortDirection = 'ascending' | 'descending' | 'none';

export interface ColumnSort {
  readonly direction: SortDirection;
  /** Where the header leads: the same view, sorted. Works without scripts. */
  readonly href?: string;
  /** Or what it does. */
  readonly onSort?: () => void;
}

export interface Column<Row> {
  readonly key: string;
  readonly header: ReactNode;
  /** The header is for assistive technology only: over pictures and keys. */
  readonly headerHidden?: boolean;
  readonly cell: (row: Row) => ReactNode;
  readonly align?: 'start' | 'end';
  /** This column names its row. */
  readonly rowHeader?: boolean;
  readonly sort?: ColumnSort;
  /** Keeps its text on one line; the table scrolls sideways instead. */
  readonly nowrap?: boolean;
  /** Extra classes for the column's cells: widths. */
  readonly className?: string;
}

export interface DataTableProps<Row> {
  readonly caption: string;
  /** The caption is for assistive technology only, because a heading already says it. */
  readonly captionHidden?: boolean;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  /** In place of the body when there are no rows. */
  readonly empty?: ReactNode;
  /** Rows of a height for pictures, or tight ones for plain figures. */
  readonly density?: 'roomy' | 'tight';
}

/**
 * A native table with an ink rule under its head and hair rules between rows. On screens too narrow for it,
 * it scrolls sideways inside a region that can be reached by keyboard.
 */
export function DataTable<Row>(props: DataTableProps<Row>) {
  const { caption, captionHidden = false, columns, rows, rowKey, empty, density = 'roomy' } = props;
  const captionId = useId();
  const pad = density === 'roomy' ? 'py-3' : 'py-2';
  return (
    <section aria-labelledby={captionId} {...SCROLLABLE}>
      <table className="w-full border-collapse text-start">
        <caption
          id={captionId}
          className={captionHidden ? 'sr-only' : 'pb-2 text-start text-[0.9375rem] text-ink-2'}
        >
          {caption}
        </caption>
        <thead>
          <tr className="rule-b">
            {columns.map((column) => (
              <th
                key={column.key}
                scope="col"
                aria-sort={column.sort?.direction}
                className={cx(cell(column), 'pb-2 align-bottom text-sm font-normal text-ink-2')}
              >
                <HeaderContent column={column} />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-b border-hair">
              {columns.map((column) =>
                column.rowHeader ? (
                  <th key={column.key} scope="row" className={cx(cell(column), pad, 'font-bold')}>
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} className={cx(cell(column), pad)}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
          {rows.length === 0 && empty && (
            <tr>
              <td colSpan={columns.length} className="py-6 text-ink-2">
                {empty}
              </td>
            </tr>
          )}
        </tbody>
      </table>
    </section>
  );
}

/**
 * A region that scrolls must be reachable by keyboard, so it is a tab stop although it is no control. Positioned,
 * so that texts for assistive technology inside scroll with it and do not widen the page.
 */
const SCROLLABLE = { tabIndex: 0, className: 'scroll-region relative overflow-x-auto' };

function cell<Row>(column: Column<Row>): string {
  return cx(
    'pe-4 last:pe-0',
    column.align === 'end' ? 'text-end' : 'text-start',
    column.nowrap && 'whitespace-nowrap',
    column.className,
  );
}

const ARROWS: Readonly<Record<SortDirection, string>> = { ascending: '▲', descending: '▼', none: '' };

function HeaderContent<Row>({ column }: { column: Column<Row> }) {
  const { sort, header } = column;
  if (column.headerHidden) return <span className="sr-only">{header}</span>;
  if (!sort) return <>{header}</>;
  const inner = (
    <span>
      {header}
      <span aria-hidden="true" className="ps-1 text-[0.6em]">
        {ARROWS[sort.direction]}
      </span>
    </span>
  );
  const look = cx(
    'inline-flex min-h-12 items-end text-start hover:underline sm:min-h-6',
    sort.direction !== 'none' && 'font-bold text-ink',
  );
  return sort.href ? (
    <AppLink href={sort.href} className={look}>
      {inner}
    </AppLink>
  ) : (
    <button type="button" onClick={sort.onSort} className={look}>
      {inner}
    </button>
  );
}
