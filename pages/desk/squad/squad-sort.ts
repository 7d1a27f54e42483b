import type { SquadRow, SquadView } from '#shared/contracts/desk.ts';

export type Direction = 'ascending' | 'descending';

/** By what the grid is sorted: a member's own column, or the figure or change of one of the grid's. */
export type SortKey = 'member' | 'answers' | 'trained' | 'minutes' | `r.${string}` | `d.${string}`;

export interface Sort {
  readonly key: SortKey;
  readonly direction: Direction;
}

const OWN = ['member', 'answers', 'trained', 'minutes'] as const;

/** Names rise by themselves, figures fall: the first click gives what one looks for. */
export function firstDirection(key: SortKey): Direction {
  return key === 'member' ? 'ascending' : 'descending';
}

/** The sort an address asks for; without one, or with one this grid does not have, the last column falling. */
export function sortOf(view: Pick<SquadView, 'columns'>, search: URLSearchParams): Sort {
  const asked = search.get('sort') ?? '';
  const known =
    OWN.some((own) => own === asked) ||
    view.columns.some(({ key }) => asked === `r.${key}` || asked === `d.${key}`);
  const key = known ? (asked as SortKey) : defaultKey(view);
  const direction = search.get('dir');
  return {
    key,
    direction: !known
      ? firstDirection(key)
      : direction === 'up'
        ? 'ascending'
        : direction === 'down'
          ? 'descending'
          : firstDirection(key),
  };
}

function defaultKey({ columns }: Pick<SquadView, 'columns'>): SortKey {
  const whole = columns.find((column) => column.dealt === null);
  return whole ? `r.${whole.key}` : 'member';
}

/** The rows in order; who has no value stands last either way, equals by name. */
export function sortRows(view: Pick<SquadView, 'columns' | 'rows'>, sort: Sort): SquadRow[] {
  const sign = sort.direction === 'ascending' ? 1 : -1;
  const byName = (a: SquadRow, b: SquadRow) => a.nickname.localeCompare(b.nickname, 'en');
  return [...view.rows].sort((a, b) => {
    if (sort.key === 'member') return sign * byName(a, b);
    const [x, y] = [valueIn(a, view, sort.key), valueIn(b, view, sort.key)];
    if (x === null || y === null) return x === y ? byName(a, b) : x === null ? 1 : -1;
    return sign * (x - y) || byName(a, b);
  });
}

function valueIn(
  row: SquadRow,
  { columns }: Pick<SquadView, 'columns'>,
  key: Exclude<SortKey, 'member'>,
): number | null {
  if (key === 'answers') return row.answers;
  if (key === 'minutes') return row.minutesPerDay;
  if (key === 'trained') return row.lastTrained === null ? null : Date.parse(row.lastTrained);
  const cell = row.cells[columns.findIndex((column) => column.key === key.slice(2))];
  if (cell?.figure?.rests === 'nothing') return null;
  return (key.startsWith('r.') ? cell?.figure?.value : cell?.change) ?? null;
}
