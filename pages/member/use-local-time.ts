import { useSyncExternalStore } from 'react';

const never = () => () => {};

/**
 * Says an instant as date and time. The server does not know the device's zone, so it says UTC; the browser
 * takes over with its own right after.
 */
export function useLocalTime(): (at: number) => string {
  const timeZone = useSyncExternalStore(
    never,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => 'UTC',
  );
  return (at) =>
    new Date(at).toLocaleString('en-GB', {
      timeZone,
      day: 'numeric',
      month: 'short',
      hour: '2-digit',
      minute: '2-digit',
    });
}
