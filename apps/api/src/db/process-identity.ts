import { execFileSync } from 'node:child_process';
import { readFileSync, readlinkSync } from 'node:fs';
import { hostname } from 'node:os';
import { codeOf } from './system-error';

/** One running process, told apart from a later one that was given the same number. */
export interface ProcessIdentity {
  readonly pid: number;
  /** When it started, in the system's own terms; empty where the system does not say. */
  readonly startedAt: string;
  /** The machine (and container) in which the number means something. */
  readonly world: string;
}

export const ownIdentity = (): ProcessIdentity => ({
  pid: process.pid,
  startedAt: startOf(process.pid) ?? '',
  world: world(),
});

/** Whether a process still runs; 'unknown' when it belongs to another machine or container. */
export function isRunning(process_: ProcessIdentity): boolean | 'unknown' {
  if (process_.world !== world()) return 'unknown';
  try {
    process.kill(process_.pid, 0);
  } catch (error) {
    // EPERM: the process exists but belongs to somebody else
    if (codeOf(error) !== 'EPERM') return false;
  }
  const started = startOf(process_.pid);
  return started === undefined || process_.startedAt === '' || started === process_.startedAt;
}

/** Linux: clock ticks since boot (field 22 of /proc/PID/stat); elsewhere what ps says; undefined where neither is there. */
function startOf(pid: number): string | undefined {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // the command name may hold spaces and brackets: fields are counted after its closing bracket
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19];
  } catch {
    return process.platform === 'linux' ? undefined : startByPs(pid);
  }
}

function startByPs(pid: number): string | undefined {
  try {
    const said = execFileSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' });
    return said.trim() || undefined;
  } catch {
    return undefined;
  }
}

function world(): string {
  try {
    const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
    return `${boot} ${readlinkSync('/proc/self/ns/pid')}`;
  } catch {
    return hostname();
  }
}
