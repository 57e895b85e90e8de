import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { DatabaseFailure, DataFolderInUse } from './database-failures';

interface Holder {
  readonly pid: number;
  /** Start of the process, so that a reused pid is not taken for the holder. */
  readonly startedAt: string;
}

const FILE = 'ligament.lock';

/**
 * Takes the data folder for this process alone, or throws DataFolderInUse naming the holder.
 * A lock whose process is gone is taken over. Returns the function that gives the folder back.
 */
export function lockDataFolder(folder: string): () => void {
  const path = join(folder, FILE);
  makeFolder(folder);
  const mine: Holder = { pid: process.pid, startedAt: startOf(process.pid) ?? '' };
  for (let attempt = 0; attempt < 3; attempt += 1) {
    if (create(path, mine)) return () => release(path, mine);
    const holder = read(path);
    if (holder && isAlive(holder)) throw new DataFolderInUse(folder, holder.pid);
    setAside(path);
  }
  throw new DatabaseFailure(
    `the lock ${path} cannot be taken; remove it if no other Ligament runs.`,
  );
}

function makeFolder(folder: string): void {
  try {
    mkdirSync(folder, { recursive: true });
  } catch (error) {
    throw new DatabaseFailure(`the data folder ${folder} cannot be created (${reasonOf(error)}).`);
  }
}

function create(path: string, holder: Holder): boolean {
  try {
    writeFileSync(path, JSON.stringify(holder), { flag: 'wx', mode: 0o600 });
    return true;
  } catch (error) {
    if (codeOf(error) === 'EEXIST') return false;
    throw new DatabaseFailure(`the data folder cannot be written to (${reasonOf(error)}).`);
  }
}

function read(path: string): Holder | undefined {
  try {
    const content = JSON.parse(readFileSync(path, 'utf8')) as Partial<Holder>;
    return typeof content.pid === 'number' && typeof content.startedAt === 'string'
      ? { pid: content.pid, startedAt: content.startedAt }
      : undefined;
  } catch {
    // unreadable or just removed: treated as nobody's
    return undefined;
  }
}

/** Renaming lets only one of several newcomers take a stale lock away. */
function setAside(path: string): void {
  const aside = `${path}.${process.pid}.stale`;
  try {
    renameSync(path, aside);
    rmSync(aside, { force: true });
  } catch (error) {
    if (codeOf(error) !== 'ENOENT') throw error;
  }
}

function release(path: string, mine: Holder): void {
  const holder = read(path);
  if (holder?.pid === mine.pid && holder.startedAt === mine.startedAt)
    rmSync(path, { force: true });
}

function isAlive(holder: Holder): boolean {
  try {
    process.kill(holder.pid, 0);
  } catch (error) {
    // EPERM: the process exists but belongs to somebody else
    if (codeOf(error) !== 'EPERM') return false;
  }
  const started = startOf(holder.pid);
  return started === undefined || holder.startedAt === '' || started === holder.startedAt;
}

/** Start time of a process in clock ticks since boot (field 22 of /proc/PID/stat); undefined where there is no /proc. */
function startOf(pid: number): string | undefined {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
    // the command name may hold spaces and brackets: fields are counted after its closing bracket
    return `${boot}:${stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? ''}`;
  } catch {
    return undefined;
  }
}

const codeOf = (error: unknown): unknown =>
  error instanceof Error && 'code' in error ? error.code : undefined;
const reasonOf = (error: unknown): string =>
  error instanceof Error ? error.message : String(error);
