import { watch } from 'node:fs';
import { join } from 'node:path';

/**
 * Calls back once after a burst of changes to sources under the given folders.
 * @param {string} root
 * @param {string[]} folders
 * @param {(file: string) => void} changed Hears one of the files, relative to `root`.
 * @returns {() => void} Stops watching.
 */
export function watchSources(root, folders, changed) {
  let timer;
  const watchers = folders.map((folder) =>
    watch(join(root, folder), { recursive: true }, (_event, name) => {
      // Tools write scratch files beside the sources: those are not changes.
      if (!name || !/\.(ts|tsx|sql|json|csv)$/.test(name) || /\.build-/.test(name)) return;
      clearTimeout(timer);
      timer = setTimeout(() => changed(join(folder, name)), 150);
    }),
  );
  return () => {
    clearTimeout(timer);
    for (const watcher of watchers) watcher.close();
  };
}
