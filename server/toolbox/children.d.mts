import type { ChildProcess, SpawnOptions } from 'node:child_process';

/** See children.mjs. */
export class Children {
  constructor(onChange?: (alive: { pid: number; birth: string }[]) => void);
  start(command: string, args: readonly string[], options?: SpawnOptions): ChildProcess;
  run(
    command: string,
    args: readonly string[],
    options?: { onLine?: (line: string) => void; input?: string } & SpawnOptions,
  ): Promise<{ code: number; output: string }>;
  endAll(grace?: number): Promise<void>;
}
export function endGroup(child: { pid: number; birth: string }, grace: number): Promise<void>;
