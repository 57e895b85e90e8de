import { randomUUID } from 'node:crypto';
import {
  linkSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { DatabaseFailure, DataFolderInUse } from './database-failures';
import { isRunning, ownIdentity, type ProcessIdentity } from './process-identity';
import { codeOf, reasonOf } from './system-error';

const FILE = 'ligament.lock';
const SIGN_OF_LIFE_MS = 5000;
/** Silence after which a holder on another machine or in another container counts as gone. */
const SILENCE_MS = 30_000;
/** Half a lock is that of a process just writing it, where files cannot be made whole at once. */
const WRITING_MS = 1000;
/** A takeover takes milliseconds; one that old was cut short. */
const TAKEOVER_MS = 10_000;

/**
 * Takes the data folder for this process alone, or throws DataFolderInUse naming the holder.
 * A lock whose process is gone is taken over. Returns the function that gives the folder back.
 */
export function lockDataFolder(folder: string): () => void {
  makeFolder(folder);
  const path = join(folder, FILE);
  const mine = JSON.stringify({ ...ownIdentity(), key: randomUUID() });
  for (let attempt = 0; attempt < 40; attempt += 1) {
    if (createWhole(path, mine)) return keep(path, mine);
    const found = read(path);
    if (found !== undefined) {
      const holder = holderOf(found);
      if (holder ? isHeld(path, holder) : ageOf(path) < WRITING_MS) {
        if (holder) throw new DataFolderInUse(folder, holder.pid);
      } else if (takeOver(path, found, mine)) return keep(path, mine);
    }
    pause(50);
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

/** Creates a file with its whole content at once, so that nobody ever reads half a lock; false when it exists. */
function createWhole(path: string, content: string): boolean {
  const draft = `${path}.${randomUUID()}`;
  try {
    writeFileSync(draft, content, { mode: 0o600 });
    try {
      linkSync(draft, path);
    } catch (error) {
      if (codeOf(error) === 'EEXIST') return false;
      // a file system without links: created and written in two steps
      writeFileSync(path, content, { flag: 'wx', mode: 0o600 });
    }
    return true;
  } catch (error) {
    if (codeOf(error) === 'EEXIST') return false;
    throw new DatabaseFailure(`the data folder cannot be written to (${reasonOf(error)}).`);
  } finally {
    rmSync(draft, { force: true });
  }
}

/** Replaces a stale lock by ours. One process at a time does so, and only if the lock is still the one found stale. */
function takeOver(path: string, stale: string, mine: string): boolean {
  const guard = `${path}.takeover`;
  if (!createWhole(guard, mine)) {
    if (ageOf(guard) > TAKEOVER_MS) rmSync(guard, { force: true });
    return false;
  }
  try {
    if (read(path) !== stale) return false;
    const draft = `${path}.${randomUUID()}`;
    writeFileSync(draft, mine, { mode: 0o600 });
    renameSync(draft, path);
    return true;
  } finally {
    rmSync(guard, { force: true });
  }
}

/** Shows that the holder lives, until the folder is given back. */
function keep(path: string, mine: string): () => void {
  const signs = setInterval(() => {
    try {
      const now = new Date();
      if (read(path) === mine) utimesSync(path, now, now);
    } catch {
      // a sign missed for a moment does no harm
    }
  }, SIGN_OF_LIFE_MS);
  signs.unref();
  return () => {
    clearInterval(signs);
    if (read(path) === mine) rmSync(path, { force: true });
  };
}

function isHeld(path: string, holder: ProcessIdentity): boolean {
  const running = isRunning(holder);
  return running === 'unknown' ? ageOf(path) < SILENCE_MS : running;
}

function read(path: string): string | undefined {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return undefined;
  }
}

function holderOf(content: string): ProcessIdentity | undefined {
  try {
    const { pid, startedAt, world } = JSON.parse(content) as Partial<ProcessIdentity>;
    if (typeof pid !== 'number' || typeof startedAt !== 'string') return undefined;
    return { pid, startedAt, world: world ?? '' };
  } catch {
    return undefined;
  }
}

/** Milliseconds since a file was last touched; endless when it is gone. */
function ageOf(path: string): number {
  try {
    return Date.now() - statSync(path).mtimeMs;
  } catch {
    return Infinity;
  }
}

const pause = (milliseconds: number) =>
  Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, milliseconds);
