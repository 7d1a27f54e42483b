import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Children } from '#server/toolbox/children.mjs';
import { ensureKeys } from '#server/toolbox/keys.mjs';
import { startServer as startProcess } from '#server/toolbox/server-process.mjs';
import { plainEnvironment } from './clone.ts';
import type { DatabaseUrls } from './database.ts';

export interface RunningServer {
  /** Like http://127.0.0.1:41234, without a slash at the end. */
  readonly url: string;
  /** The exit code, once the process is gone. */
  readonly ended: Promise<number>;
  /** Asks the process to end, waits for it, and removes its secrets. */
  stop(): Promise<void>;
}

/**
 * Starts the real server process on a free port, on built pages.
 * @param env What to set beside the usual, for example `{ DEMO: '0' }`.
 */
export async function startServer(
  urls: DatabaseUrls,
  env: Readonly<Record<string, string>> = {},
): Promise<RunningServer> {
  const folder = mkdtempSync(join(tmpdir(), 'sixteenfold-server-'));
  ensureKeys(folder);
  const server = await startProcess({
    root: fileURLToPath(new URL('../..', import.meta.url)),
    env: {
      ...plainEnvironment(),
      NODE_ENV: 'production',
      DEMO: '1',
      SECRETS_DIR: folder,
      DATABASE_URL: urls.appUrl,
      DATABASE_OWNER_URL: urls.ownerUrl,
      ...env,
    },
    logFile: null,
    host: '127.0.0.1',
    port: 0,
    children: new Children(),
  });
  return {
    url: server.address,
    ended: server.ended,
    stop: async () => {
      await server.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
