import { execFile } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { expect, it } from 'vitest';

const probe = fileURLToPath(new URL('./zone-probe.ts', import.meta.url));
const ZONES = ['UTC', 'Pacific/Apia', 'America/St_Johns', 'Australia/Lord_Howe', 'Etc/GMT+12'];

it('the model says the same in every process time zone', async () => {
  const { stdout } = await promisify(execFile)(process.execPath, ['--import', 'tsx', probe, ...ZONES]);
  const said: { offset: number; model: unknown }[] = JSON.parse(stdout);
  // Minutes behind UTC on 1 January 2024: the zones did take effect.
  expect(said.map(({ offset }) => offset)).toEqual([0, -780, 210, -660, 720]);
  for (const { model } of said) expect(model).toEqual(said[0]?.model);
}, 60_000);
