import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

/**
 * When a process began, in its system's own words; with the process's number it names one process for good,
 * since numbers are used again. '' if there is no such process, or only its remains (a zombie).
 * @param {number} pid
 */
export function processBirth(pid) {
  if (!Number.isInteger(pid) || pid <= 0) return '';
  if (process.platform === 'linux') {
    try {
      // proc(5): field 3 is the state, field 22 the start time in ticks since boot; field 2 may hold spaces.
      const stat = readFileSync(`/proc/${pid}/stat`, 'latin1');
      const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
      return fields[0] === 'Z' || fields[0] === 'X' ? '' : `${fields[19]}`;
    } catch {
      return '';
    }
  }
  try {
    return execFileSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' }).trim();
  } catch {
    return '';
  }
}

/** The command line of a process, '' if there is none. */
export function processCommand(pid) {
  try {
    if (process.platform === 'linux')
      return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
    return execFileSync('ps', ['-o', 'command=', '-p', String(pid)], { encoding: 'utf8' }).trim();
  } catch {
    return '';
  }
}

/** The process that started another; 0 if that is gone. */
function parentOf(pid) {
  try {
    if (process.platform === 'linux') {
      const stat = readFileSync(`/proc/${pid}/stat`, 'latin1');
      return Number(stat.slice(stat.lastIndexOf(')') + 2).split(' ')[1]);
    }
    return Number(execFileSync('ps', ['-o', 'ppid=', '-p', String(pid)], { encoding: 'utf8' }));
  } catch {
    return 0;
  }
}

/**
 * The npm that runs this script and the shell between the two, which when they are told to stop do not all pass it
 * on; none if no npm runs it.
 * @returns {{pid: number, birth: string}[]}
 */
export function launchers() {
  if (!process.env.npm_lifecycle_event) return [];
  return [process.ppid, parentOf(process.ppid)]
    .filter((pid) => pid > 1)
    .map((pid) => ({ pid, birth: processBirth(pid) }));
}

/** Sends a signal to a process (or, with a negative number, to its group); false if it is gone. */
export function signal(pid, name) {
  try {
    process.kill(pid, name);
    return true;
  } catch {
    return false;
  }
}

/** Waits until a process is gone. @returns whether it went within `timeout` ms. */
export async function waitForEnd(pid, timeout) {
  const until = Date.now() + timeout;
  while (processBirth(pid) !== '') {
    if (Date.now() > until) return false;
    await sleep(20);
  }
  return true;
}
