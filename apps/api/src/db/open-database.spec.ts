import { type ChildProcessByStdio, spawn } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import type { Readable } from 'node:stream';
import { history } from '@ligament/domain/schema/history';
import { sites } from '@ligament/domain/schema/sites';
import { count, eq, sql } from 'drizzle-orm';
import { pino } from 'pino';
import { layMigratedDatabase } from '../../../../tests/support/migrated-folder';
import { DatabaseFailure, DataFolderInUse } from './database-failures';
import { openDatabase, type OpenDatabase } from './open-database';
import { SupervisedPglite } from './supervised-pglite';

const ROOT = resolve(import.meta.dirname, '../../../..');
const log = pino({ level: 'silent' });
const open = (dataDir: string) => openDatabase({ dataDir, log });
const newFolder = () => {
  const made = mkdtempSync(join(tmpdir(), 'ligament-data-'));
  folders.push(made);
  return made;
};
const folders: string[] = [];
const children: ChildProcessByStdio<null, Readable, null>[] = [];

afterAll(() => {
  for (const child of children) child.kill('SIGKILL');
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
});

describe('openDatabase', () => {
  let dataDir: string;
  let database: OpenDatabase;

  beforeAll(async () => {
    dataDir = newFolder();
    // what a first start that was killed leaves behind
    mkdirSync(join(dataDir, 'database.new'));
    writeFileSync(join(dataDir, 'database.new/PG_VERSION'), '18\n');
    database = await open(dataDir);
  }, 60_000);
  afterAll(() => database.close());

  it('makes a migrated database in an empty folder, whatever an interrupted start has left', async () => {
    expect(existsSync(join(dataDir, 'database.new'))).toBe(false);
    expect(await database.db.select({ n: count() }).from(sites)).toEqual([{ n: 0 }]);
    expect(database.healthy()).toBe(true);
  });

  it('holds the folder for itself', async () => {
    await expect(open(dataDir)).rejects.toThrow(DataFolderInUse);
    const { said, exitCode } = await write(dataDir, () => false);
    expect(said.join()).toContain(`is in use by process ${process.pid}`);
    expect(exitCode).toBe(69);
  }, 30_000);

  it('lets nobody change or remove history', async () => {
    for (const attempt of [
      database.db.update(history).set({ summary: 'nothing happened' }),
      database.db.delete(history),
    ]) {
      await expect(attempt).rejects.toMatchObject({ cause: { code: '42501' } });
    }
    await expect(database.db.execute(sql`truncate history`)).rejects.toThrow();
  });

  it('copies itself while it serves; the copy opens and holds what was written before', async () => {
    await database.db.insert(sites).values({ code: 'COPY', name: 'Copied', timeZone: 'UTC' });
    const copy = newFolder();
    await database.copyTo?.(join(copy, 'database'));
    await database.db.delete(sites).where(eq(sites.code, 'COPY'));
    const opened = await open(copy);
    expect(await opened.db.select({ name: sites.name }).from(sites)).toEqual([{ name: 'Copied' }]);
    await opened.close();
  }, 30_000);

  it('brings statistics up to date and writes a checkpoint on request', async () => {
    await database.db.insert(sites).values({ code: 'STAT', name: 'Counted', timeZone: 'UTC' });
    await database.analyze();
    await database.checkpoint();
    const counted = await database.db.execute(
      sql`select n_distinct from pg_stats where tablename = 'sites' and attname = 'code'`,
    );
    expect(counted).toMatchObject({ rows: [{ n_distinct: -1 }] });
    await database.db.delete(sites);
  });

  it('gives the folder back, and a second start changes nothing', async () => {
    await database.db.insert(sites).values({ code: 'KEPT', name: 'Kept', timeZone: 'UTC' });
    await database.close();
    expect(existsSync(join(dataDir, 'ligament.lock'))).toBe(false);
    database = await open(dataDir);
    expect(await database.db.select({ code: sites.code }).from(sites)).toEqual([{ code: 'KEPT' }]);
  }, 30_000);
});

describe('openDatabase on a folder it cannot use', () => {
  it('refuses a database of a newer version in one sentence, and gives the folder back', async () => {
    const dataDir = newFolder();
    await layMigratedDatabase(join(dataDir, 'database'));
    const owner = new SupervisedPglite(join(dataDir, 'database'), log);
    await owner.open();
    await owner.query(
      'insert into drizzle.__drizzle_migrations (hash, created_at) values ($1, $2)',
      ['from the future', 1_900_000_000_000],
    );
    await owner.close();
    await expect(open(dataDir)).rejects.toThrow(/written by a newer version \(\d+ migrations/);
    expect(existsSync(join(dataDir, 'ligament.lock'))).toBe(false);
  }, 30_000);

  it('says why where the folder cannot be made', async () => {
    const file = join(newFolder(), 'file');
    writeFileSync(file, '');
    await expect(open(join(file, 'data'))).rejects.toThrow(DatabaseFailure);
  });

  it('says why where there is something else in its place', async () => {
    const dataDir = newFolder();
    writeFileSync(join(dataDir, 'database'), 'not a folder');
    await expect(open(dataDir)).rejects.toThrow(/database did not open/);
    expect(existsSync(join(dataDir, 'ligament.lock'))).toBe(false);
  }, 30_000);
});

describe('a process killed while it writes', () => {
  it('loses nothing it has acknowledged, and the next start takes the lock over', async () => {
    const dataDir = newFolder();
    await layMigratedDatabase(join(dataDir, 'database'));
    const { said } = await write(dataDir, (lines) => lines.length >= 40);
    const database = await open(dataDir);
    const [row] = await database.db.select({ n: count() }).from(sites);
    // one more may have been written without its answer having arrived
    expect(row?.n).toBeGreaterThanOrEqual(said.length);
    expect(row?.n).toBeLessThanOrEqual(said.length + 1);
    await database.close();
  }, 60_000);
});

/** Lets another process write into a data folder and kills it, without warning, when `enough` says so. */
async function write(dataDir: string, enough: (said: readonly string[]) => boolean) {
  const child = spawn(
    process.execPath,
    ['--import', 'tsx', join(ROOT, 'tests/support/database-writer.ts'), dataDir],
    { cwd: ROOT, stdio: ['ignore', 'pipe', 'inherit'] },
  );
  children.push(child);
  const said: string[] = [];
  child.stdout.on('data', (chunk: Buffer) => {
    said.push(...String(chunk).split('\n').filter(Boolean));
    if (enough(said)) child.kill('SIGKILL');
  });
  const exitCode = await new Promise<number | null>((done) => child.on('close', done));
  return { said, exitCode };
}
