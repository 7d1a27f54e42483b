import { type ReactNode, useId } from 'react';
import { shellText } from '#shared/text/shell.ts';
import { AppLink, cx, type SortDirection } from './ui/index.ts';

export interface LedgerColumn<Row> {
  readonly key: string;
  readonly header: string;
  /** The header is for assistive technology only: over pictures. */
  readonly headerHidden?: boolean;
  readonly cell: (row: Row) => ReactNode;
  /** This column names its row. */
  readonly rowHeader?: boolean;
  readonly sort?: { readonly direction: SortDirection; readonly href: string };
  /** Width and alignment where there is room for a table. */
  readonly className?: string;
  /** Place in the row's grid where there is not. */
  readonly stacked: string;
}

export interface LedgerTableProps<Row> {
  readonly caption: string;
  readonly columns: readonly LedgerColumn<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  readonly rowClass?: (row: Row) => string;
  /** Columns of a row's grid on narrow screens. */
  readonly stackedRow: string;
  /** In place of the rows when there are none. */
  readonly empty?: ReactNode;
}

const ARROWS: Readonly<Record<SortDirection, string>> = { ascending: '▲', descending: '▼', none: '' };

/**
 * A table with an ink rule under its head and hair rules between rows. Where it has no room beside each other
 * its cells stand in a small grid under each other, row by row, instead of running off the screen. On paper it is a
 * table.
 */
export function LedgerTable<Row>(props: LedgerTableProps<Row>) {
  const { caption, columns, rows, rowKey, rowClass, stackedRow, empty } = props;
  const captionId = useId();
  const sortable = columns.some(({ sort }) => sort !== undefined);
  return (
    <table
      aria-labelledby={captionId}
      className="block w-full border-collapse text-start lg:table print:table"
    >
      <caption id={captionId} className="sr-only">
        {caption}
      </caption>
      <thead
        className={cx(
          'block lg:table-header-group print:table-header-group',
          !sortable && 'max-lg:not-print:sr-only',
        )}
      >
        <tr className="rule-b flex flex-wrap gap-x-5 lg:table-row print:table-row">
          {columns.map((column) => (
            <th
              key={column.key}
              scope="col"
              aria-sort={column.sort?.direction}
              className={cx(
                'pb-2 text-start align-bottom text-sm font-normal text-ink-2 lg:pe-4 lg:last:pe-0 print:pe-3',
                !column.sort && 'max-lg:not-print:sr-only',
                column.className,
              )}
            >
              <Header column={column} />
            </th>
          ))}
        </tr>
      </thead>
      <tbody className="block lg:table-row-group print:table-row-group">
        {rows.map((row) => (
          <tr
            key={rowKey(row)}
            className={cx(
              'grid gap-x-4 border-b border-hair py-3 lg:table-row print:table-row',
              stackedRow,
              rowClass?.(row),
            )}
          >
            {columns.map((column) => {
              const look = cx(
                'text-start lg:py-3 lg:pe-4 lg:last:pe-0 print:py-2 print:pe-3',
                column.stacked,
                column.className,
              );
              return column.rowHeader ? (
                <th key={column.key} scope="row" className={cx(look, 'font-bold')}>
                  {column.cell(row)}
                </th>
              ) : (
                <td key={column.key} className={look}>
                  {column.cell(row)}
                </td>
              );
            })}
          </tr>
        ))}
        {rows.length === 0 && empty && (
          <tr className="block lg:table-row">
            <td colSpan={columns.length} className="block py-6 text-ink-2 lg:table-cell">
              {empty}
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
}

function Header<Row>({ column: { header, headerHidden, sort } }: { column: LedgerColumn<Row> }) {
  if (headerHidden) return <span className="sr-only">{header}</span>;
  // As tall as a header that can be pressed, so that all stand on one line.
  if (!sort) return <span className="inline-flex items-end lg:min-h-6">{header}</span>;
  return (
    <AppLink
      href={sort.href}
      className={cx(
        'inline-flex min-h-12 items-end hover:underline lg:min-h-6',
        sort.direction !== 'none' && 'font-bold text-ink',
      )}
    >
      <span className="sr-only">{shellText.sortBy} </span>
      {header}
      <span aria-hidden="true" className="ps-1 text-[0.6em]">
        {ARROWS[sort.direction]}
      </span>
    </AppLink>
  );
}
