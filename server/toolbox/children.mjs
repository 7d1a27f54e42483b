import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { PlainError } from './plain-error.mjs';
import { processBirth, signal, waitForEnd } from './processes.mjs';

/**
 * The programs started by one command. Each runs in a process group of its own, so that a terminal's Ctrl-C
 * reaches this process alone, which then stops them in the right order, and all that they started in turn.
 */
export class Children {
  #alive = new Map();
  #onChange;
  #closed = false;

  /** @param {(alive: {pid: number, birth: string}[]) => void} [onChange] Told whenever one begins or ends. */
  constructor(onChange = () => {}) {
    this.#onChange = onChange;
  }

  /** Starts a program. Options are those of node:child_process spawn. */
  start(command, args, options = {}) {
    if (this.#closed) throw new PlainError('Stopping.');
    const child = spawn(command, args, { ...options, detached: true });
    if (child.pid !== undefined) {
      const { pid } = child;
      this.#alive.set(pid, { pid, birth: processBirth(pid) });
      this.#onChange([...this.#alive.values()]);
      child.once('exit', () => {
        this.#alive.delete(pid);
        this.#onChange([...this.#alive.values()]);
      });
    }
    return child;
  }

  /**
   * Runs a program to its end.
   * @param {{onLine?: (line: string) => void, input?: string}} [options] With spawn's options beside;
   *   `onLine` hears standard output line by line.
   * @returns {Promise<{code: number, output: string}>} Exit code (128 when ended by a signal, 127 when it
   *   could not be started) and the last 40,000 characters of both outputs.
   */
  run(command, args, { onLine, input, ...options } = {}) {
    return new Promise((resolve) => {
      const child = this.start(command, args, { ...options, stdio: ['pipe', 'pipe', 'pipe'] });
      let output = '';
      const keep = (text) => {
        output = (output + text).slice(-40_000);
      };
      child.once('error', (error) => resolve({ code: 127, output: error.message }));
      child.stdout.setEncoding('utf8').on('data', keep);
      child.stderr.setEncoding('utf8').on('data', keep);
      if (onLine) createInterface({ input: child.stdout }).on('line', onLine);
      // A program that ends before it has read its input is not a fault of this one.
      child.stdin.on('error', () => {});
      child.stdin.end(input);
      child.once('close', (code) => resolve({ code: code ?? 128, output }));
    });
  }

  /** From now on nothing more is started: `start` throws. */
  close() {
    this.#closed = true;
  }

  /** Ends whatever still runs: asked first, after `grace` ms not asked any more. */
  async endAll(grace = 3_000) {
    await Promise.all([...this.#alive.values()].map((child) => endGroup(child, grace)));
  }

  /** Ends whatever still runs, at once. */
  killAll() {
    for (const { pid } of this.#alive.values()) signal(-pid, 'SIGKILL');
  }
}

/** Ends a process and its whole group, if it is still the process that it was. */
export async function endGroup({ pid, birth }, grace) {
  if (birth === '' || processBirth(pid) !== birth) return;
  signal(-pid, 'SIGTERM');
  if (!(await waitForEnd(pid, grace))) {
    signal(-pid, 'SIGKILL');
    await waitForEnd(pid, 2_000);
  }
}
