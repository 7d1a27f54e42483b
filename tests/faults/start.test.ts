import { rmSync } from 'node:fs';
import { availableParallelism, loadavg } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, expect, it, vi } from 'vitest';
import { filesUnder } from '#server/toolbox/fingerprint.mjs';
import { freePort } from '#server/toolbox/ports.mjs';
import { processBirth, signal } from '#server/toolbox/processes.mjs';
import {
  descendants,
  has,
  type Known,
  launch,
  makeClone,
  type Running,
  stillAlive,
} from '#tests/support/clone.ts';

// One clone goes through all that can happen to it, in this order: a first start takes long, and every later start
// must cope with what an earlier one left anyway.

const START = ['node', 'server/start.mjs'];
const LONG = 240_000;

let clone: string;
let port: number;
let seen: Known[] = [];
const launched: Running[] = [];

beforeAll(async () => {
  clone = await makeClone();
  port = await freePort();
}, LONG);

afterEach(async ({ task }) => {
  // The output tells what happened, where the assertion does not.
  if (task.result?.state === 'fail') for (const { output } of launched) console.log(output());
  // A test that failed may have left its own running.
  for (const { child, ended } of launched.splice(0)) {
    if (child.exitCode === null && child.signalCode === null) child.kill('SIGINT');
    await ended;
  }
}, LONG);

afterAll(() => {
  for (const { pid } of stillAlive(seen)) signal(pid, 'SIGKILL');
  rmSync(clone, { recursive: true, force: true });
});

/** Starts a command in the clone, without a demonstration's people, which take long to make. */
function start(command = START, env: Record<string, string> = {}): Running {
  const running = launch(clone, command, { PORT: String(port), DEMO: '0', ...env });
  launched.push(running);
  return running;
}

/** Waits until it is open; notes the processes that it started. @returns the health check's status. */
async function opened(running: Running): Promise<number> {
  const address = await running.opened;
  const pid = running.child.pid ?? 0;
  seen = [...seen, { pid, birth: processBirth(pid), command: 'the command itself' }, ...below(running)];
  return (await fetch(`${address}/healthz`)).status;
}

function below(running: Running): Known[] {
  return descendants(running.child.pid ?? 0);
}

it('finishes a first start that was killed while the database was made', { timeout: LONG }, async () => {
  const first = start();
  await vi.waitUntil(() => has(clone, '.data/cluster/pgdata/global'), { timeout: LONG, interval: 5 });
  first.child.kill('SIGKILL');
  await first.ended;
  const second = start();
  expect(await opened(second)).toBe(200);
  expect(second.output()).toContain('An earlier first start was cut short. It is done again.');

  // Another one, in the same folder.
  const twin = start(START, { PORT: '0' });
  expect(await twin.ended).toBe(1);
  expect(twin.output()).toContain(`already running from this folder (process ${second.child.pid})`);
  expect(twin.output()).not.toMatch(/^\s+at /m);

  // Another one elsewhere, on the same port.
  const rival = start(START, { DATA_DIR: join(clone, '.data-rival') });
  expect(await rival.ended).toBe(1);
  expect(rival.output()).toContain(
    `Port ${port} is taken by another program. Choose another one: PORT=${port + 1} npm start`,
  );
  expect(rival.output()).not.toMatch(/^\s+at /m);

  // Ctrl-C, as a terminal sends it: to the whole group.
  const started = below(second);
  expect(started.length).toBeGreaterThan(5);
  process.kill(-(second.child.pid ?? 0), 'SIGINT');
  expect(await second.ended).toBe(0);
  expect(stillAlive(started)).toEqual([]);
  expect(has(clone, '.data/lock.json')).toBe(false);
});

it('is up again in under five seconds', { timeout: LONG }, async () => {
  const began = performance.now();
  const again = start();
  expect(await opened(again)).toBe(200);
  const took = performance.now() - began;
  // Measured on a machine of its own. Where others are at work, each gets as much less of it as there are of them.
  const share = Math.max(1, (loadavg()[0] ?? 0) / availableParallelism());
  expect(took).toBeLessThan(5_000 * share);
  expect(again.output()).not.toMatch(/Tables|Catalogue|built|cut short|damaged/);
  again.child.kill('SIGINT');
  expect(await again.ended).toBe(0);
});

it('recovers from being killed: what was left running is ended, and the port is free again', {
  timeout: LONG,
}, async () => {
  const victim = start();
  await opened(victim);
  const left = below(victim);
  victim.child.kill('SIGKILL');
  await victim.ended;
  expect(stillAlive(left).length).toBeGreaterThan(0);
  const next = start();
  expect(await opened(next)).toBe(200);
  expect(stillAlive(left)).toEqual([]);

  // The server dies under it.
  const started = below(next);
  const server = started.find(({ command }) => command.includes('server/main.ts'));
  process.kill(server?.pid ?? 0, 'SIGKILL');
  expect(await next.ended).toBe(1);
  expect(next.output()).toMatch(/The server ended by itself .* Its log is .*server\.log\./);
  expect(stillAlive(started)).toEqual([]);
});

it('stops everything when npm is told to stop', { timeout: LONG }, async () => {
  const npm = start(['npm', 'start']);
  await opened(npm);
  const started = below(npm);
  npm.child.kill('SIGTERM');
  await npm.ended;
  await vi.waitUntil(() => stillAlive(started).length === 0, { timeout: 15_000 });
  expect(has(clone, '.data/lock.json')).toBe(false);
});

it('starts with half of its data folder deleted', { timeout: LONG }, async () => {
  const files = filesUnder(join(clone, '.data'), '.');
  expect(files.length).toBeGreaterThan(500);
  for (const file of files.filter((_, index) => index % 2 === 0)) rmSync(join(clone, '.data', file));
  const repaired = start();
  expect(await opened(repaired)).toBe(200);
  expect(repaired.output()).toMatch(/The database was damaged .* moved to .* and a new one made\./);
  repaired.child.kill('SIGHUP');
  expect(await repaired.ended).toBe(0);
});
