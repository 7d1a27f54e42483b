import { tmpdir } from 'node:os';
import { runCommand } from '../../server/toolbox/command.mjs';
import { ensurePackages } from '../../server/toolbox/packages.mjs';
import { ensurePages } from '../../server/toolbox/pages.mjs';
import { explain } from '../../server/toolbox/plain-error.mjs';
import { root } from '../../server/toolbox/workplace.mjs';
import { ensureChromium } from '../support/chromium.mjs';
import { openThrowAway } from '../support/throw-away.mjs';
import { CHECKS } from '../verify.mjs';
import { choose } from './choose.mjs';
import { runProject } from './vitest.mjs';

/** Everything `npm test` does; ends with the process, its last line being "N passed, N failed". */
export function test(words) {
  return runCommand({
    place: tmpdir(),
    stopped: 130,
    async body(command) {
      const tally = new Tally(command.steps);
      try {
        await runAll(command, tally, choose(root, words));
      } catch (error) {
        tally.add('Preparation', performance.now(), {
          passed: 0,
          failed: 1,
          remarks: [explain(error, root)],
        });
      }
      return tally.close();
    },
  });
}

async function runAll({ steps: say, children, onEnd }, tally, { steps, filters, files }) {
  await say.run('Packages', (progress) => ensurePackages({ root, children, progress }));
  const env = {};
  if (steps.includes('browser'))
    env.CHROMIUM_PATH = await say.run('Chromium', async (progress) => {
      const program = await ensureChromium(children, progress);
      return [program, program];
    });
  if (steps.includes('api') || steps.includes('browser')) {
    const { cluster } = await say.run('PostgreSQL', async (progress) => {
      const opened = await openThrowAway(children, progress);
      onEnd(opened.stop);
      return [`${opened.cluster.version} on 127.0.0.1:${opened.cluster.port}, for these tests only`, opened];
    });
    env.TEST_DATABASE_ADMIN_URL = cluster.adminUrl;
    env.TEST_DATABASE_OWNER_URL = cluster.ownerUrl;
    env.TEST_DATABASE_APP_URL = cluster.appUrl;
  }
  for (const step of steps) {
    say.line(`\n${step}`);
    if (step === 'browser') await tally.run('build', () => buildPages(say, children));
    if (step === 'verify')
      for (const [name, check] of CHECKS) await tally.run(name, () => verdict(check(root)));
    else if (step === 'types') await tally.run(step, () => runTool(children, ['tests/types.mjs']));
    else if (step === 'lint')
      await tally.run(step, () => runTool(children, ['node_modules/@biomejs/biome/bin/biome', 'check', '.']));
    else
      await tally.run(step, () =>
        runProject({ root, project: step, expected: files[step], filters, env, children }),
      );
  }
}

/** A check counts as one test; its faults are its remarks. */
function verdict(faults) {
  return { passed: faults.length === 0 ? 1 : 0, failed: faults.length === 0 ? 0 : 1, remarks: faults };
}

async function runTool(children, args) {
  const { code, output } = await children.run(process.execPath, args, { cwd: root });
  return verdict(code === 0 ? [] : output.trimEnd().split('\n'));
}

async function buildPages(say, children) {
  await say.run('Pages', (progress) => ensurePages({ root, children, progress }));
  return verdict([]);
}

/** Keeps count over all steps. */
class Tally {
  #rows = [];
  #steps;

  constructor(steps) {
    this.#steps = steps;
  }

  /** Runs something that gives counts; what it throws is one failure. */
  async run(name, work) {
    const began = performance.now();
    let counts;
    try {
      counts = await work();
    } catch (error) {
      counts = { passed: 0, failed: 1, remarks: [explain(error, root)] };
    }
    this.add(name, began, counts);
  }

  add(name, began, { passed, failed, remarks }) {
    const seconds = ((performance.now() - began) / 1000).toFixed(1);
    this.#rows.push({ name, passed, failed, remarks, seconds });
    if (failed > 0) this.#tell(this.#rows.at(-1));
    else this.#steps.line(`  ${name}: ${passed} passed (${seconds} s)`);
  }

  #tell({ name, passed, failed, remarks, seconds }) {
    this.#steps.line(`  ${name}: ${passed} passed, ${failed} FAILED (${seconds} s)`);
    for (const remark of remarks) this.#steps.line(`    ${remark}`);
  }

  /** Tells what failed once more, then the sum. @returns {number} The exit code: a run without tests is no success. */
  close() {
    const sum = (key) => this.#rows.reduce((total, row) => total + row[key], 0);
    const bad = this.#rows.filter(({ failed }) => failed > 0);
    if (bad.length > 0) this.#steps.line('\nWhat failed:');
    for (const row of bad) this.#tell({ ...row, remarks: row.remarks.slice(0, 20) });
    this.#steps.line(`\n${sum('passed')} passed, ${sum('failed')} failed`);
    return bad.length === 0 && sum('passed') > 0 ? 0 : 1;
  }
}
