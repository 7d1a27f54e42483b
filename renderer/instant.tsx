import { useSyncExternalStore } from 'react';

const never = () => () => {};

/**
 * An instant as a date, with the time where `time` is set. The server does not know the reader's zone and says
 * UTC; the browser takes over with its own right after.
 */
export function Instant({ at, time = false }: { at: number; time?: boolean }) {
  const timeZone = useSyncExternalStore(
    never,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => 'UTC',
  );
  const date = new Date(at);
  return (
    <time dateTime={date.toISOString()} className="whitespace-nowrap">
      {date.toLocaleString('en-GB', {
        timeZone,
        day: 'numeric',
        month: 'short',
        year: 'numeric',
        ...(time ? ({ hour: '2-digit', minute: '2-digit' } as const) : {}),
      })}
    </time>
  );
}
