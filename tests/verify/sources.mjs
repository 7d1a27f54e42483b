import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { filesUnder } from '../../server/toolbox/fingerprint.mjs';

/** The folders at the top that hold the product's own code (DEVELOPERS.md, "Where things are"). */
export const TOP_FOLDERS = ['pages', 'renderer', 'server', 'shared', 'database', 'tests'];

/** All source files, with their text. */
export function sourceFiles(root, folders = TOP_FOLDERS) {
  return folders
    .flatMap((folder) => filesUnder(root, folder))
    .filter((file) => /\.(ts|tsx|mts|mjs|js)$/.test(file))
    .map((file) => ({ file, text: readFileSync(join(root, file), 'utf8') }));
}

/** The number of the line, from 1, that a place in a text is on. */
export function lineAt(text, index) {
  return text.slice(0, index).split('\n').length;
}
