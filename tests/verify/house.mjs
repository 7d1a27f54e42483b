import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { lineAt, sourceFiles, TOP_FOLDERS } from './sources.mjs';

const TOP_FILES = [
  'README.md',
  'DEVELOPERS.md',
  'LICENSE',
  'package.json',
  'package-lock.json',
  'tsconfig.json',
  'biome.json',
  'vite.config.ts',
  'vitest.config.ts',
  'drizzle.config.ts',
];
/** Made by the program or by its tools. */
const MADE = ['node_modules', 'dist', 'coverage'];

/** What lies at the top and should not: every new thing has a folder to go to. */
export function checkTop(root) {
  const allowed = new Set([...TOP_FOLDERS, 'public', ...TOP_FILES, ...MADE]);
  return readdirSync(root)
    .filter((name) => !name.startsWith('.') && !allowed.has(name) && !name.endsWith('.log'))
    .map((name) => `${name}: not one of the folders and files at the top; put it with what it serves`);
}

/** The lock file works with whatever registry a machine is set to: it names none. */
export function checkLock(root) {
  const text = readFileSync(join(root, 'package-lock.json'), 'utf8');
  return [...text.matchAll(/"resolved":|\bregistry\b/g)].map(
    (match) => `package-lock.json:${lineAt(text, match.index)}: names where a package came from`,
  );
}

/** Tests that are skipped, or run alone. */
const SKIPPED =
  /\b(it|test|describe|suite)(\.\w+)*\.(only|skip|todo|skipIf|runIf|fails)\b|\bx(it|describe)\(|\b(ctx|context)\.skip\(/g;
/** Words that silence the compiler or the linter; grouped so that this line does not match itself. */
const SILENCED = /@ts-(?:ignore|expect-error|nocheck)\b|biome-(?:ignore)\b/g;

/** No test is skipped, and no check is silenced. */
export function checkHonesty(root) {
  return sourceFiles(root).flatMap(({ file, text }) => {
    const skipped = /\.test\.tsx?$/.test(file) ? [...text.matchAll(SKIPPED)] : [];
    return [...skipped, ...text.matchAll(SILENCED)].map(
      (match) => `${file}:${lineAt(text, match.index)}: ${match[0].trim()}`,
    );
  });
}
