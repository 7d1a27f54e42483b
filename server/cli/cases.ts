import { runCases } from './run-cases.ts';

// A reader that has seen enough (head, a pager) closes the pipe: that is not a fault.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit();
  throw error;
});

process.exitCode = runCases(process.argv.slice(2), {
  out: (text) => process.stdout.write(`${text}\n`),
  err: (text) => process.stderr.write(`${text}\n`),
  // npm runs scripts in the project's folder; files are named from the folder npm was called in.
  folder: process.env.INIT_CWD ?? process.cwd(),
});
