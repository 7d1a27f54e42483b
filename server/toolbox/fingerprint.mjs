import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

/** Files that tools write beside the sources. */
const NOT_SOURCE = /\.build-.*\.mjs$|^\.|~$/;

/**
 * All files under a path, which may be a file itself, in a fixed order.
 * @param {string} root
 * @param {string} path Relative to `root`.
 * @returns {string[]} Relative to `root`.
 */
export function filesUnder(root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full)
    .filter((name) => !NOT_SOURCE.test(name))
    .sort()
    .flatMap((name) => filesUnder(root, `${path}/${name}`));
}

/**
 * A hash of the names and contents of all files under the given paths.
 * @param {string} root
 * @param {string[]} paths Relative to `root`.
 */
export function fingerprint(root, paths) {
  const hash = createHash('sha256');
  for (const file of paths.flatMap((path) => filesUnder(root, path))) {
    const content = readFileSync(join(root, file));
    hash.update(`${file}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}
