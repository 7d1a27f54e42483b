import { randomBytes } from 'node:crypto';
import { chmodSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { readJson, writeJson } from './files.mjs';

/**
 * Sees that a folder holds the keys that sign sessions; makes the first one.
 * @param {string} secretsDir Made for its owner only.
 */
export function ensureKeys(secretsDir) {
  mkdirSync(secretsDir, { recursive: true, mode: 0o700 });
  chmodSync(secretsDir, 0o700);
  const file = join(secretsDir, 'keys.json');
  const keys = readJson(file);
  if (Array.isArray(keys) && keys.length > 0) return chmodSync(file, 0o600);
  // 256 bits, the least that HS256 may have (RFC 7518, section 3.2).
  const secret = randomBytes(32).toString('base64url');
  const kid = randomBytes(6).toString('base64url');
  writeJson(file, [{ kid, secret, created: new Date().toISOString() }]);
}
