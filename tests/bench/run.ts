/** `npm run -s bench -- NAME [--json]`: measures one part of the product on this machine. */
import { parseArgs } from 'node:util';
import type { Bench } from './bench.ts';

/** Every bench by name; each is loaded only when asked for. */
const BENCHES: Readonly<Record<string, () => Promise<{ bench: Bench }>>> = {
  lastlayer: () => import('./lastlayer.ts'),
  memory: () => import('./memory.ts'),
};

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: { json: { type: 'boolean', default: false } },
});
const name = positionals[0] ?? '';
const load = BENCHES[name];
if (!load) {
  process.stderr.write(
    `Usage: npm run -s bench -- NAME [--json]\nNAME is one of ${Object.keys(BENCHES).join(', ')}.\n`,
  );
  process.exit(2);
}
const { bench } = await load();
const figures = await bench();
if (values.json) {
  process.stdout.write(`${JSON.stringify({ bench: name, figures }, null, 2)}\n`);
} else {
  for (const { name: what, value, unit } of figures)
    process.stdout.write(
      `${what.padEnd(48)} ${value.toLocaleString('en-GB', { maximumFractionDigits: 2 }).padStart(14)} ${unit}\n`,
    );
}
