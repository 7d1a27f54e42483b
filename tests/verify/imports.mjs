import { existsSync, readFileSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import { lineAt, sourceFiles, TOP_FOLDERS } from './sources.mjs';

/** Who may import whom; the same table is in DEVELOPERS.md. */
const MAY_IMPORT = {
  shared: ['shared'],
  database: ['database', 'shared'],
  server: ['server', 'database', 'shared'],
  pages: ['pages', 'renderer', 'shared'],
  renderer: ['renderer', 'shared'],
  tests: TOP_FOLDERS,
};

/** The start scripts run before any package is there, so they name files by their place; see `plain`. */
const PLAIN = /\.d\.mts$|\.mjs$/;

const IMPORT =
  /(?:^|\n)\s*(?:import|export)\b(?<what>[^'";]*?)\bfrom\s*'(?<from>[^']+)'|\bimport\(\s*'(?<later>[^']+)'|(?:^|\n)\s*import\s*'(?<bare>[^']+)'/g;

/**
 * Checks each import against the table above: no folder reaches up, none reaches across by a relative path, every
 * path has its extension and exists.
 * @returns {string[]} A line for each fault.
 */
export function checkImports(root) {
  return sourceFiles(root).flatMap(({ file, text }) =>
    [...text.matchAll(IMPORT)].flatMap((match) => {
      const { what = '', from, later, bare } = match.groups;
      const problem = checkOne(root, file, from ?? later ?? bare, /^\s*type\b/.test(what));
      return problem ? [`${file}:${lineAt(text, match.index + 1)}: ${problem}`] : [];
    }),
  );
}

function checkOne(root, file, specifier, typeOnly) {
  const own = file.split('/')[0];
  if (!specifier.startsWith('.') && !specifier.startsWith('#')) return plainProblem(file, specifier);
  const relative = specifier.startsWith('.');
  const path = (relative ? normalize(join(dirname(file), specifier)) : specifier.slice(1)).replace(
    /\?.*$/,
    '',
  );
  const other = path.split('/')[0];
  if (!/\.(ts|tsx|mjs|mts|css|json|csv|svg)$/.test(path)) return `'${specifier}' has no file extension`;
  if (!existsSync(join(root, path))) return `'${specifier}' does not exist`;
  if (relative && other !== own && !PLAIN.test(file))
    return `'${specifier}' goes into another top folder: write '#${path}'`;
  if (!relative && other === own && own !== 'tests')
    return `'${specifier}' is in the same top folder: write it relative`;
  if (!typeOnly && bringsSchemas(root, file, path))
    return `'${specifier}' brings the schema library to the browser: import its types, or a file without schemas`;
  if (MAY_IMPORT[own].includes(other) || typeOnly) return '';
  // The cluster is started by the same small helpers as the server.
  if (own === 'database' && PLAIN.test(file) && path.startsWith('server/toolbox/')) return '';
  return `${own}/ may not import from ${other}/`;
}

/** Whether a page would load the schemas of a contract: what runs on the server alone may. */
function bringsSchemas(root, file, path) {
  return (
    /^(pages|renderer)\//.test(file) &&
    !/\.server\.tsx?$/.test(file) &&
    path.startsWith('shared/contracts/') &&
    readFileSync(join(root, path), 'utf8').includes("from 'zod'")
  );
}

/** The scripts that install the packages cannot use any. */
function plainProblem(file, specifier) {
  const plain = file.endsWith('.mjs') && /^(server|database|tests\/(support|run|verify))/.test(file);
  return plain && !specifier.startsWith('node:')
    ? `'${specifier}': this script runs before the packages are installed, it may only import from Node`
    : '';
}
