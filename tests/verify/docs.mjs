import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { readJson } from '../../server/toolbox/files.mjs';
import { filesUnder } from '../../server/toolbox/fingerprint.mjs';
import { lineAt, TOP_FOLDERS } from './sources.mjs';

const DOCUMENTS = ['README.md', 'DEVELOPERS.md'];
/** Made by the program, so not there in a fresh clone. */
const MADE = /^(\.data\d*|dist|node_modules)(\/|$)/;
const SOURCE = /\.(ts|tsx|mts|mjs|json|md|csv|sql|css|png|svg)$/;

/**
 * Checks that every file, folder and npm script which the documents name is there.
 * @returns {string[]} A line for each that is not.
 */
export function checkDocuments(root) {
  const { scripts } = readJson(join(root, 'package.json'));
  return DOCUMENTS.flatMap((document) => {
    const file = join(root, document);
    if (!existsSync(file)) return [`${document} does not exist`];
    const text = readFileSync(file, 'utf8');
    const tell = (match, problem) => `${document}:${lineAt(text, match.index)}: ${problem}`;
    const paths = [...text.matchAll(/(?<!`)`([^`\n]+)`(?!`)|\]\(([^)#\s]+)[^)]*\)/g)]
      .filter((match) => isPath(match[1] ?? match[2], Boolean(match[2])))
      .filter((match) => !isThere(root, match[1] ?? match[2]))
      .map((match) => tell(match, `${match[1] ?? match[2]} does not exist`));
    const commands = [...text.matchAll(/\bnpm run (?:-s )?([\w:-]+)/g)]
      .filter(([, name]) => !scripts[name])
      .map((match) => tell(match, `there is no npm script ${match[1]}`));
    return [...paths, ...commands];
  });
}

/** A name without a folder may be anywhere. */
function isThere(root, path) {
  if (existsSync(join(root, path))) return true;
  return (
    !path.includes('/') &&
    TOP_FOLDERS.some((folder) => filesUnder(root, folder).some((file) => file.endsWith(`/${path}`)))
  );
}

/** Whether a code span, or a link's target, means a file or folder of the repository. */
function isPath(text, link) {
  if (link) return !/^[a-z]+:/.test(text);
  // "./state.ts" shows how something is written, not where it is.
  if (!/^[\w.@+-][\w.@+/-]*$/.test(text) || /^\.\.?\//.test(text) || MADE.test(text)) return false;
  return (text.includes('/') && TOP_FOLDERS.includes(text.split('/')[0])) || SOURCE.test(text);
}
