// Read by every Node that may be installed, old ones too: no new syntax and no imports in this file.

/**
 * Whether the running Node is one that this program is made for (package.json, "engines").
 * @param {string} version Like "20.12.0".
 * @returns {string} '' if it is, else one sentence for the person who ran the command.
 */
export function checkNode(version) {
  const parts = version.split('.').map(Number);
  const major = parts[0];
  const minor = parts[1];
  if (major > 22 || major < 20 || (major === 20 && minor < 12)) {
    return (
      'Sixteenfold needs Node 20 (20.12 or newer; 21 and 22 may do); this is Node ' +
      version +
      '. Install Node 20 and run the command again.'
    );
  }
  return '';
}
