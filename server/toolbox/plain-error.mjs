/** A problem told to a person in one clear sentence or two; everything else is a fault of ours. */
export class PlainError extends Error {
  name = 'PlainError';
}

/** What a full disk looks like, from Node, from PostgreSQL, from npm and from apt. */
const DISK_FULL = /ENOSPC|EDQUOT|No space left on device|Disk quota exceeded|could not extend file/;

/** Whether an error's or a program's text says that a disk is full. */
export function saysDiskFull(text) {
  return DISK_FULL.test(text);
}

/** The error for a full disk, met while working on `place`. */
export function diskFull(place) {
  return new PlainError(
    `The disk that holds ${place} is full. Free some space and run the command again; nothing that was saved is lost.`,
  );
}

/**
 * One sentence for whatever went wrong, without a stack.
 * @param {unknown} error
 * @param {string} place The folder worked in, named when the disk is full.
 */
export function explain(error, place) {
  if (error instanceof PlainError) return error.message;
  const { code, path, message } = error instanceof Error ? error : new Error(String(error));
  if (saysDiskFull(`${code} ${message}`)) return diskFull(place).message;
  if ((code === 'EACCES' || code === 'EPERM') && path)
    return `This user may not write ${path}. Give it to the user who runs this command, or choose another folder: DATA_DIR=… before the command.`;
  if (code === 'EROFS') return `${path ?? place} is on a file system that cannot be written to.`;
  return `Something unforeseen went wrong: ${message.split('\n')[0]}`;
}
