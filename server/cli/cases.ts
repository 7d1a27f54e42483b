import { runCases } from './run-cases.ts';

process.exitCode = runCases(process.argv.slice(2), {
  out: (text) => process.stdout.write(`${text}\n`),
  err: (text) => process.stderr.write(`${text}\n`),
  // npm runs scripts in the project's folder; files are named from the folder npm was called in.
  folder: process.env.INIT_CWD ?? process.cwd(),
});
