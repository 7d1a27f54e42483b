import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { installPackages } from '../../server/toolbox/debian.mjs';
import { PlainError } from '../../server/toolbox/plain-error.mjs';

/** Where a Chromium may be, besides the path. */
export const USUAL_PLACES = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome-stable',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
];

const NAMES = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'];

function isProgram(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/**
 * The first Chromium found, or undefined.
 * @param {{CHROMIUM_PATH?: string, PATH?: string}} [env] CHROMIUM_PATH goes first, and alone if it is set.
 * @throws {PlainError} if CHROMIUM_PATH names no program.
 */
export function findChromium(env = process.env, places = USUAL_PLACES) {
  if (env.CHROMIUM_PATH) {
    if (isProgram(env.CHROMIUM_PATH)) return env.CHROMIUM_PATH;
    throw new PlainError(`CHROMIUM_PATH names ${env.CHROMIUM_PATH}, which is not a program.`);
  }
  const onPath = (env.PATH ?? '').split(delimiter).filter(Boolean);
  return [...places, ...onPath.flatMap((folder) => NAMES.map((name) => join(folder, name)))].find(isProgram);
}

/** Finds Chromium or installs Debian's. @returns {Promise<string>} The program. */
export async function ensureChromium(children, progress) {
  const found = findChromium();
  if (found) return found;
  // With letters for what the product's own typeface lacks.
  const packages = ['chromium', 'fonts-liberation'];
  await installPackages({
    packages,
    what: 'Chromium, which the browser tests drive, was',
    children,
    progress,
  });
  const installed = findChromium();
  if (!installed)
    throw new PlainError('Chromium was installed but not found. Set CHROMIUM_PATH to the program.');
  return installed;
}
