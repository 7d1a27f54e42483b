/** Largest file taken, in bytes; the server holds the same line. */
export const LARGEST_FILE = 5_000_000;

/**
 * A file's bytes in base64, as they are. `onProgress` hears how many bytes have been read.
 * @throws Error when the browser cannot read the file, for example because it was moved.
 */
export function readAsBase64(file: Blob, onProgress: (bytes: number) => void): Promise<string> {
  return new Promise((resolve, reject) => {
    const reader = new FileReader();
    reader.onprogress = ({ loaded }) => onProgress(loaded);
    reader.onerror = () => reject(reader.error ?? new Error('unreadable'));
    reader.onload = () => {
      // data:<type>;base64,<content>; an empty file has no content part.
      const url = String(reader.result);
      const comma = url.indexOf(',');
      resolve(comma < 0 ? '' : url.slice(comma + 1));
    };
    reader.readAsDataURL(file);
  });
}
