import type { Cluster } from '#database/cluster.mjs';
import type { Children } from '#server/toolbox/children.mjs';

/** See throw-away.mjs. */
export function openThrowAway(
  children: Children,
  progress?: (percent: number | null, text: string) => void,
): Promise<{ cluster: Cluster; dataDir: string; stop(): Promise<void> }>;
