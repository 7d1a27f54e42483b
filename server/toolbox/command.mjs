import { Children } from './children.mjs';
import { explain, PlainError } from './plain-error.mjs';
import { launchers, processBirth } from './processes.mjs';
import { Steps } from './steps.mjs';

/**
 * A second Ctrl-C after this many ms means: do not wait (what is committed is safe all the same). Sooner it is the
 * same one heard twice, from the terminal and from npm.
 */
const HURRY_AFTER = 1_000;

/**
 * Runs one of the product's commands: whatever way it ends (done, failed, Ctrl-C, a closed terminal), all that
 * it started is stopped, in reverse order, and nothing else; a failure is one sentence.
 * @param {{place: string, body: (command: Command) => Promise<number>, stopped?: number}} what `place` is the folder
 *   to name when a disk is full; the body gives the exit code; `stopped` is the exit code after Ctrl-C.
 *
 * @typedef {{steps: Steps, children: Children, onEnd: (stop: () => unknown) => void,
 *   onChildren: (listen: (alive: {pid: number, birth: string}[]) => void) => void,
 *   fail: (sentence: string) => void}} Command
 *   `onEnd` adds what to undo; `onChildren` hears which programs run; `fail` ends the command from outside the
 *   body, with a sentence.
 */
export async function runCommand({ place, body, stopped = 0 }) {
  const steps = new Steps();
  const undo = [];
  const listeners = [];
  const children = new Children((alive) => {
    for (const listen of listeners) listen(alive);
  });
  let ending;

  async function undoAll() {
    children.close();
    for (const stop of undo.reverse()) {
      try {
        await stop();
      } catch (error) {
        console.error(explain(error, place));
      }
    }
    await children.endAll();
  }
  function end(code, sentence) {
    if (sentence && !ending) console.error(`\n${sentence}`);
    ending ??= undoAll().then(() => process.exit(code));
    return ending;
  }

  let asked;
  const stop = () => {
    if (asked === undefined) {
      asked = Date.now();
      steps.line('\nStopping …');
      end(stopped);
    } else if (Date.now() - asked > HURRY_AFTER) {
      children.killAll();
      process.exit(1);
    }
  };
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, stop);
  const above = launchers();
  const look = setInterval(() => {
    if (asked === undefined && above.some(({ pid, birth }) => processBirth(pid) !== birth)) stop();
  }, 500);
  look.unref();
  // A closed terminal or pipe is no reason to stop, and none to fail.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
  process.on('uncaughtException', (error) => end(1, explain(error, place)));
  process.on('unhandledRejection', (error) => end(1, explain(error, place)));

  try {
    const code = await body({
      steps,
      children,
      onEnd: (stop) => undo.push(stop),
      onChildren: (listen) => listeners.push(listen),
      fail: (sentence) => end(1, sentence),
    });
    await end(code);
  } catch (error) {
    // Whatever fails because it is being stopped is no news.
    await end(1, error instanceof PlainError ? error.message : explain(error, place));
  }
}
