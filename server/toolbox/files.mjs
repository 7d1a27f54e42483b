import { closeSync, fsyncSync, openSync, readFileSync, renameSync, rmSync, writeSync } from 'node:fs';

/** Reads a JSON file; undefined if it is missing or not whole. */
export function readJson(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    if (error.code === 'ENOENT' || error instanceof SyntaxError) return undefined;
    throw error;
  }
}

/**
 * Writes a file so that a reader, and the next start after a kill or a power cut, finds the old text or the
 * new one and never a part.
 * @param {number} [mode] Permissions; 0600 unless told, since most of these files hold secrets.
 */
export function writeWhole(file, text, mode = 0o600) {
  const draft = `${file}.${process.pid}.new`;
  try {
    const handle = openSync(draft, 'w', mode);
    try {
      writeSync(handle, text);
      fsyncSync(handle);
    } finally {
      closeSync(handle);
    }
    renameSync(draft, file);
  } catch (error) {
    rmSync(draft, { force: true });
    throw error;
  }
}

/** Writes a value as a JSON file, whole or not at all. */
export function writeJson(file, value) {
  writeWhole(file, `${JSON.stringify(value, null, 2)}\n`);
}
