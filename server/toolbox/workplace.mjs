import { mkdirSync, realpathSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureKeys } from './keys.mjs';
import { lockFolder } from './lock.mjs';
import { readPort, requirePort } from './ports.mjs';

export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** The data folder that the environment names, absolute; not yet made. */
export function dataFolder(env = process.env) {
  return resolve(root, env.DATA_DIR || '.data');
}

/**
 * Makes the data folder this command's own and sees that the address is free.
 * @param {import('./command.mjs').Command} command
 * @returns {Promise<{dataDir: string, host: string, port: number, env: NodeJS.ProcessEnv}>} `env` is what the
 *   server and the database's scripts are started with.
 */
export async function takeWorkplace({ children, onEnd, onChildren }) {
  const host = process.env.HOST || '127.0.0.1';
  const port = readPort(process.env.PORT);
  const folder = dataFolder();
  // Others may pass through, to what is theirs in it (the database's folder), but not look around.
  mkdirSync(folder, { recursive: true, mode: 0o711 });
  const dataDir = realpathSync(folder);
  const lock = await lockFolder(dataDir);
  onEnd(async () => {
    // Nobody may take the folder while something of ours still writes in it.
    await children.endAll();
    lock.release();
  });
  onChildren(lock.keep);
  await requirePort(host, port);
  const secrets = join(dataDir, 'secrets');
  ensureKeys(secrets);
  const env = { ...process.env, SECRETS_DIR: secrets, DEMO: process.env.DEMO || '1' };
  return { dataDir, host, port, env };
}
