import { FlatView } from '#renderer/ui/index.ts';
import type { ShownCase } from '#shared/contracts/ledger.ts';

/** A few cases side by side, each with its name under it. */
export function CaseStrip({
  shown,
  size = 'normal',
}: {
  shown: readonly ShownCase[];
  size?: 'normal' | 'small';
}) {
  return (
    <ul className="flex flex-wrap items-start gap-2">
      {shown.map(({ number, name, picture }) => (
        <li key={number} className={size === 'small' ? 'w-11' : 'w-12 sm:w-14 print:w-11'}>
          <FlatView stickers={picture.stickers} colouring={picture.colouring} className="w-full" />
          <span className="block text-center text-xs leading-tight text-ink-2">{name}</span>
        </li>
      ))}
    </ul>
  );
}
