import { join } from 'node:path';
import { readJson } from './files.mjs';

/**
 * The demonstration's accounts as a small table, a line each.
 * @param {string} root
 * @returns {string[]}
 */
export function accountLines(root) {
  const accounts = readJson(join(root, 'database/seed/demo-accounts.json')) ?? [];
  const width = (key) => Math.max(...accounts.map((account) => account[key].length));
  return accounts.map(
    ({ signIn, password, who }) =>
      `  ${signIn.padEnd(width('signIn'))}   ${password.padEnd(width('password'))}   ${who}`,
  );
}

/** The address to type, for one that the server listens on. */
export function addressToType(listening) {
  const url = new URL(listening);
  if (url.hostname === '0.0.0.0' || url.hostname === '[::]') url.hostname = '127.0.0.1';
  return url.origin;
}
