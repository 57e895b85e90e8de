import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { DatabaseFailure, DataFolderInUse } from './database-failures';
import { lockDataFolder } from './data-folder-lock';
import { ownIdentity } from './process-identity';

const CONTENDER = resolve(import.meta.dirname, '../../../../tests/support/lock-contender.ts');
const TSX = resolve(import.meta.dirname, '../../../../node_modules/tsx/dist/loader.mjs');
const GONE = 2 ** 22 - 3;

let folder: string;
let lock: string;
const children: ChildProcess[] = [];

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'ligament-lock-'));
  lock = join(folder, 'ligament.lock');
});
afterEach(() => {
  for (const child of children.splice(0)) child.kill('SIGKILL');
  rmSync(folder, { recursive: true, force: true });
});

const leave = (holder: object | string, ageMs = 0) => {
  writeFileSync(lock, typeof holder === 'string' ? holder : JSON.stringify(holder));
  const then = new Date(Date.now() - ageMs);
  utimesSync(lock, then, then);
};

const holderIn = (path: string) =>
  (JSON.parse(readFileSync(path, 'utf8')) as { pid: number; startedAt: string }).pid;

describe('lockDataFolder', () => {
  it('takes a free folder, makes it where it is missing, and gives it back', () => {
    const deep = join(folder, 'a/b');
    const unlock = lockDataFolder(deep);
    expect(holderIn(join(deep, 'ligament.lock'))).toBe(process.pid);
    unlock();
    expect(existsSync(join(deep, 'ligament.lock'))).toBe(false);
    expect(lockDataFolder(deep)).toBeInstanceOf(Function);
  });

  it('refuses a folder in use, naming folder and holder', () => {
    const unlock = lockDataFolder(folder);
    expect(() => lockDataFolder(folder)).toThrow(DataFolderInUse);
    expect(() => lockDataFolder(folder)).toThrow(
      new RegExp(`${folder} is in use by process ${process.pid}`),
    );
    unlock();
  });

  it('takes over the lock of a process that is gone', () => {
    leave({ ...ownIdentity(), pid: GONE });
    lockDataFolder(folder);
    expect(holderIn(lock)).toBe(process.pid);
  });

  it('takes over when the number of the holder was given to another process', () => {
    leave({ ...ownIdentity(), startedAt: '1' });
    lockDataFolder(folder)();
    expect(existsSync(lock)).toBe(false);
  });

  it('waits for silence before it takes over from another machine or container', () => {
    const elsewhere = { ...ownIdentity(), pid: GONE, world: 'another container' };
    leave(elsewhere, 10_000);
    expect(() => lockDataFolder(folder)).toThrow(DataFolderInUse);
    leave(elsewhere, 31_000);
    expect(lockDataFolder(folder)).toBeInstanceOf(Function);
  });

  it('takes over half a lock once nobody can be writing it any more', () => {
    leave('{"pid": 1', 1500);
    lockDataFolder(folder);
    expect(holderIn(lock)).toBe(process.pid);
  });

  it('does not remove a lock that has become another’s', () => {
    const unlock = lockDataFolder(folder);
    leave({ ...ownIdentity(), pid: GONE });
    unlock();
    expect(holderIn(lock)).toBe(GONE);
  });

  it('says in one sentence why a folder cannot be used', () => {
    const file = join(folder, 'file');
    writeFileSync(file, '');
    expect(() => lockDataFolder(join(file, 'data'))).toThrow(DatabaseFailure);
    expect(() => lockDataFolder(join(file, 'data'))).toThrow(/cannot be created \(ENOTDIR/);
  });

  it('lets exactly one of several newcomers take a stale lock over', async () => {
    leave({ ...ownIdentity(), pid: GONE });
    const startAt = String(Date.now() + 2500);
    const results = await Promise.all(Array.from({ length: 4 }, () => contend(folder, startAt)));
    expect(results.toSorted()).toEqual(['in use', 'in use', 'in use', 'taken']);
  }, 20_000);
});

/** Another process that takes the lock at a given moment, says how it went, and lives on. */
function contend(where: string, startAt: string): Promise<string> {
  const child = spawn(process.execPath, ['--import', TSX, CONTENDER, where, startAt], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  children.push(child);
  return new Promise((done) => child.stdout.once('data', (said) => done(String(said).trim())));
}
