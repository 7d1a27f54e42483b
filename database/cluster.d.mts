import type { ChildProcess } from 'node:child_process';
import type { Children } from '../server/toolbox/children.mjs';

export interface Cluster {
  readonly adminUrl: string;
  readonly ownerUrl: string;
  readonly appUrl: string;
  readonly port: number;
  readonly version: number;
  readonly id: string;
  readonly made: boolean;
  readonly logFile: string;
  readonly server: ChildProcess;
  stop(): Promise<void>;
}

/** See cluster.mjs. */
export function openCluster(wish: {
  dataDir: string;
  children: Children;
  throwAway?: boolean;
  progress?: (percent: number | null, text: string) => void;
  notice?: (sentence: string) => void;
  places?: { versioned: string[]; path: string };
}): Promise<Cluster>;
