import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import type { Worker } from 'node:worker_threads';
import { pino } from 'pino';
import { layMigratedDatabase } from '../../../../tests/support/migrated-folder';
import { DatabaseUnavailable, StorageFull } from './database-failures';
import { SupervisedPglite } from './supervised-pglite';

const log = pino({ level: 'silent' });
/** Takes minutes. */
const RUNAWAY = 'select count(*) from generate_series(1, 1000000000) a';

let folder: string;
let client: SupervisedPglite;
let diskFull = false;

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'ligament-db-'));
  await layMigratedDatabase(folder);
  client = new SupervisedPglite(folder, log, {
    deadlineMs: 20_000,
    idleDeadlineMs: 400,
    beforeWrite: () => {
      if (diskFull) throw new StorageFull('full');
    },
  });
  await client.open();
  await client.query('create table notes (id int primary key, text text, day date, bytes bytea)');
  await client.query('grant all on notes to ligament_app');
  await client.actAsApplication();
  client.deadlineMs = 1500;
}, 60_000);

afterAll(async () => {
  await client.close();
  rmSync(folder, { recursive: true, force: true });
});

beforeEach(() => client.query('delete from notes'));

const add = (id: number) => ['insert into notes (id) values ($1)', [id]] as const;
const ids = async () => (await client.query('select id from notes order by id')).rows;

describe('a supervised database', () => {
  it('answers in rows of objects or arrays, dates as text and bytes as bytes', async () => {
    const bytes = new Uint8Array([0, 255, 7]);
    await client.query('insert into notes values (1, $1, $2, $3)', ['a', '2027-02-28', bytes]);
    const { rows } = await client.query('select * from notes');
    expect(rows).toEqual([{ id: 1, text: 'a', day: '2027-02-28', bytes: expect.anything() }]);
    const { rows: arrays } = await client.query('select bytes from notes', [], {
      rowMode: 'array',
    });
    expect(Array.from((arrays as Uint8Array[][])[0]?.[0] ?? [])).toEqual([0, 255, 7]);
  });

  it('keeps code and constraint of a refusal', async () => {
    await client.query(...add(1));
    await expect(client.query(...add(1))).rejects.toMatchObject({
      code: '23505',
      constraint: 'notes_pkey',
    });
  });

  it('refuses a parameter that cannot be sent, and goes on', async () => {
    await expect(client.query('select $1', [() => 1])).rejects.toThrow(/could not be cloned/);
    await expect(client.query('select 1 as one')).resolves.toMatchObject({ rows: [{ one: 1 }] });
    expect(client.healthy()).toBe(true);
  });

  it('lets nobody see or write into a transaction under way', async () => {
    let seen: unknown[] | undefined;
    const other = wait(20).then(async () => (seen = await ids()));
    await client.transaction(async (tx) => {
      await tx.query(...add(1));
      await wait(150);
      expect(seen).toBeUndefined();
      await tx.query(...add(2));
    });
    await other;
    expect(seen).toEqual([{ id: 1 }, { id: 2 }]);
  });

  it('keeps nothing of a transaction that throws', async () => {
    const attempt = client.transaction(async (tx) => {
      await tx.query(...add(1));
      throw new Error('changed my mind');
    });
    await expect(attempt).rejects.toThrow('changed my mind');
    expect(await ids()).toEqual([]);
  });

  it('refuses the database itself inside a transaction, but not afterwards in what it started', async () => {
    let later: Promise<unknown> | undefined;
    await client.transaction(async (tx) => {
      await expect(client.query('select 1')).rejects.toThrow(/only the transaction/);
      await expect(client.transaction(() => Promise.resolve())).rejects.toThrow(/only the transac/);
      await tx.query('select 1');
      later = wait(50).then(() => client.query('select 2 as two'));
    });
    await expect(later).resolves.toMatchObject({ rows: [{ two: 2 }] });
  });

  it('ends a transaction that holds the connection and does nothing', async () => {
    let late: Promise<unknown> | undefined;
    const attempt = client.transaction(async (tx) => {
      await tx.query(...add(1));
      await wait(700);
      late = tx.query(...add(2));
      await late;
    });
    await expect(attempt).rejects.toThrow(DatabaseUnavailable);
    await wait(500);
    await expect(late).rejects.toThrow(/is over/);
    expect(await ids()).toEqual([]);
  });

  it('refuses writes while the disk is full, and goes on reading', async () => {
    await client.query(...add(1));
    diskFull = true;
    try {
      await expect(client.query(...add(2))).rejects.toThrow(StorageFull);
      const attempt = client.transaction((tx) => tx.query('delete from notes'));
      await expect(attempt).rejects.toThrow(StorageFull);
      expect(await ids()).toEqual([{ id: 1 }]);
    } finally {
      diskFull = false;
    }
  });

  it('works without superuser rights and knows no way back to them', async () => {
    const { rows } = await client.query('select current_user as name');
    expect(rows).toEqual([{ name: 'ligament_app' }]);
    for (const way of ['reset role', 'do $$ begin end $$', 'discard all']) {
      await expect(client.query(way)).rejects.toThrow(/not allowed/);
    }
    await expect(client.query('select 1; reset role')).rejects.toThrow(/multiple commands/);
    await expect(
      client.query('select pg_catalog.set_config($1, $2, false)', ['role', 'postgres']),
    ).rejects.toThrow(/not allowed/);
  });

  it('goes back to few rights after upkeep, even where that fails', async () => {
    await client.maintain('checkpoint', 'vacuum (analyze) "notes"');
    await expect(client.maintain('vacuum "no such table"')).rejects.toThrow(/does not exist/);
    const { rows } = await client.query('select current_user as name');
    expect(rows).toEqual([{ name: 'ligament_app' }]);
  });
});

describe('a database worker that overruns or dies', () => {
  it('is ended at the deadline while the server goes on, and serves again with few rights', async () => {
    await client.query(...add(1));
    let ticks = 0;
    const ticking = setInterval(() => (ticks += 1), 20);
    const started = Date.now();
    const runaway = client.query(RUNAWAY);
    const queued = client.query('select current_user as name');
    await expect(runaway).rejects.toThrow(DatabaseUnavailable);
    clearInterval(ticking);
    expect(Date.now() - started).toBeLessThan(4000);
    expect(ticks).toBeGreaterThan(20);
    await expect(queued).resolves.toMatchObject({ rows: [{ name: 'ligament_app' }] });
    expect(await ids()).toEqual([{ id: 1 }]);
    expect(client.healthy()).toBe(true);
  }, 30_000);

  it('takes its transaction with it, whole', async () => {
    let afterwards: Promise<unknown> | undefined;
    const attempt = client.transaction(async (tx) => {
      await tx.query(...add(1));
      await tx.query(RUNAWAY).catch(() => undefined);
      afterwards = tx.query(...add(2));
      await afterwards;
    });
    await expect(attempt).rejects.toThrow(DatabaseUnavailable);
    await expect(afterwards).rejects.toThrow(DatabaseUnavailable);
    expect(await ids()).toEqual([]);
  }, 30_000);

  it('is replaced when its thread ends, and counts as unhealthy the third time within a minute', async () => {
    expect(client.healthy()).toBe(true);
    const interrupted = client.query(RUNAWAY);
    await wait(100);
    await killThread(client);
    await expect(interrupted).rejects.toThrow(/exited with code/);
    expect(client.healthy()).toBe(false);
    await expect(client.query('select 1 as one')).resolves.toMatchObject({ rows: [{ one: 1 }] });
  }, 30_000);

  it('answers DatabaseUnavailable once closed', async () => {
    await client.close();
    await expect(client.query('select 1')).rejects.toThrow(DatabaseUnavailable);
    expect(client.healthy()).toBe(false);
  });
});

/** Ends the worker's thread behind everybody's back, as running out of memory would. */
async function killThread(of: SupervisedPglite): Promise<void> {
  const connection: object = await (Reflect.get(of, 'connection') as Promise<object>);
  await (Reflect.get(connection, 'worker') as Worker).terminate();
}
