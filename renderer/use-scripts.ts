import { useSyncExternalStore } from 'react';

const never = () => () => {};

/** Whether scripts have taken the page over: what only they make needless (a form's key) can go then. */
export function useScripts(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
