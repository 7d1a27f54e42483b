import type { ReactNode } from 'react';

export interface DefinitionRow {
  readonly term: string;
  readonly value: ReactNode;
}

/** Terms on the left, what holds for them on the right. */
export function Definitions({ rows }: { rows: readonly DefinitionRow[] }) {
  return (
    <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-3">
      {rows.map(({ term, value }) => (
        <div key={term} className="col-span-2 grid grid-cols-subgrid">
          <dt className="text-ink-2">{term}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}
