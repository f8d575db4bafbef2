// @ts-check
import { readFileSync, readdirSync, readlinkSync } from 'node:fs';

/**
 * @param {number} pid
 * @returns {boolean} whether a process of this number runs, ours or not. One that has ended but is not yet buried by its
 *   parent does not: the first process of a container may never come round to it.
 */
export function isAlive(pid) {
  if (!Number.isSafeInteger(pid) || pid <= 0) return false;
  const state = readStat(pid)?.state;
  if (state === 'Z' || state === 'X') return false;
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM';
  }
}

/**
 * What tells a process from a later one that got the same number: its start in clock ticks since boot, with the boot's
 * own id. Null where the system has no /proc, or the process is gone.
 *
 * @param {number} pid
 * @returns {string | null}
 */
export function birthMark(pid) {
  try {
    const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
    const start = readStat(pid)?.startTicks;
    return start === undefined ? null : `${boot}/${start}`;
  } catch {
    return null;
  }
}

/**
 * The fields of a /proc/PID/stat line that are wanted here: 3 (state) and 22 (starttime), see proc(5). The second field is
 * the program's name in parentheses and may itself hold spaces and parentheses, so fields count from the last closing one.
 *
 * @param {string} line
 * @returns {{ state: string | undefined, startTicks: string | undefined }}
 */
export function parseStat(line) {
  const fromThird = line.slice(line.lastIndexOf(')') + 2).split(' ');
  return { state: fromThird[0], startTicks: fromThird[22 - 3] };
}

/** @param {number} pid */
function readStat(pid) {
  try {
    return parseStat(readFileSync(`/proc/${pid}/stat`, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * @param {number} pid
 * @returns {string | null} the program's short name as the kernel has it
 */
function programName(pid) {
  try {
    return readFileSync(`/proc/${pid}/comm`, 'utf8').trim();
  } catch {
    return null;
  }
}

/**
 * Processes of one program that work in a folder. A PostgreSQL server and each of its backends has its data folder as
 * working folder, so this finds them even when the server's own pid file is wrong.
 *
 * @param {string} folder
 * @param {string} program
 * @returns {number[]}
 */
export function processesWorkingIn(folder, program) {
  return processNumbers().filter((pid) => programName(pid) === program && workingFolder(pid) === folder);
}

/**
 * @param {number} pid
 * @returns {string | null} null when it is gone, or not ours to look at
 */
export function workingFolder(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return null;
  }
}

/** @returns {number[]} */
function processNumbers() {
  try {
    return readdirSync('/proc')
      .filter((name) => /^\d+$/.test(name))
      .map(Number);
  } catch {
    return [];
  }
}
