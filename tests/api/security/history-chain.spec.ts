import { history } from '@ligament/domain/schema/history';
import { asc, sql } from 'drizzle-orm';
import { breakOf } from '../../../apps/api/src/modules/history/verify-history';
import { FIRST_HASH } from '../../../apps/api/src/modules/history/entry-hash';
import type { HistoryRow } from '../../../apps/api/src/modules/history/history.repository';
import { makeHistory } from '../../support/mutations';
import { as, testPlant, type TestPlant } from '../../support/test-plant';

const ENTRIES = 12;

describe('the chain of the history', () => {
  let plant: TestPlant;
  let rows: HistoryRow[];

  beforeAll(async () => {
    plant = await testPlant();
    await makeHistory(plant, ENTRIES);
    rows = await plant.db.select().from(history).orderBy(asc(history.seq));
  }, 60_000);
  afterAll(() => plant.close());

  const verify = (query: Record<string, string> = {}) =>
    as(plant.app, plant.auditor).get('/api/history/verify').query(query);

  /** Place of the first break in a chain of rows, as the server would find it. */
  const firstBreak = (chain: readonly HistoryRow[]): number | null => {
    let previous = FIRST_HASH;
    for (const row of chain) {
      if (breakOf(row, previous)) return row.seq;
      previous = row.hash;
    }
    return null;
  };

  it('holds for what the product itself has written, to the millisecond', async () => {
    const { body } = await verify();
    expect(body).toEqual({
      entries: ENTRIES,
      valid: true,
      firstBreak: null,
      head: { seq: rows.at(-1)?.seq, hash: rows.at(-1)?.hash },
      anchor: null,
    });
  });

  it('shows any altered value of any entry', () => {
    for (const [index, row] of rows.entries()) {
      for (const name of Object.keys(row) as (keyof HistoryRow)[]) {
        if (name === 'seq') continue;
        const forged = rows.with(index, { ...row, [name]: altered(row[name]) });
        const found = firstBreak(forged);
        expect({ index, name, found }).toEqual({ index, name, found: expect.any(Number) });
      }
    }
  });

  it('shows a removed entry, an inserted one and any two that changed places', () => {
    for (let index = 0; index < rows.length - 1; index += 1) {
      expect(firstBreak(rows.toSpliced(index, 1))).toBe(rows[index + 1]?.seq);
      const twice = rows[index];
      if (twice) expect(firstBreak(rows.toSpliced(index, 0, twice))).not.toBeNull();
      for (let other = index + 1; other < rows.length; other += 1) {
        const [first, second] = [rows[index], rows[other]];
        if (first && second) {
          expect(firstBreak(rows.with(index, second).with(other, first))).not.toBeNull();
        }
      }
    }
  });

  it('shows entries cut off the end to whoever noted the head before', async () => {
    const head = rows.at(-1);
    expect((await verify({ noted: `${head?.seq}:${head?.hash}` })).body.anchor).toBe('stands');
    const missing = await verify({ noted: `${(head?.seq ?? 0) + 1}:${head?.hash}` });
    expect(missing.body).toMatchObject({ valid: false, anchor: 'missing' });
    const differs = await verify({ noted: `${head?.seq}:${'0'.repeat(64)}` });
    expect(differs.body).toMatchObject({ valid: false, anchor: 'differs' });
    expect((await verify({ noted: 'x' })).status).toBe(400);
  });

  it('cannot be changed, cut or emptied by the application', async () => {
    const attempts = [
      sql`update history set summary = 'forged'`,
      sql`delete from history where seq = 1`,
      sql`truncate history`,
    ];
    for (const attempt of attempts) await expect(plant.db.execute(attempt)).rejects.toThrow();
    expect((await verify()).body.valid).toBe(true);
  });

  it('names the entry when somebody with the rights of the database’s owner has forged it', async () => {
    const target = rows[4];
    await plant.db.execute(sql`reset role`);
    await plant.db.execute(sql`alter table history disable trigger all`);
    await plant.db.execute(
      sql`update history set reason = 'looks harmless' where seq = ${target?.seq}`,
    );
    await plant.db.execute(sql`alter table history enable trigger all`);
    await plant.db.execute(sql`set role ligament_app`);
    const { body } = await verify();
    expect(body).toMatchObject({ valid: false, firstBreak: { seq: target?.seq } });
    expect(body.firstBreak.why).toContain('altered');
  });

  it('is proved by engineers, auditors and administrators', async () => {
    expect((await as(plant.app, plant.planner).get('/api/history/verify')).status).toBe(403);
  });
});

/** Another value of the same kind. */
function altered(value: unknown): unknown {
  if (value instanceof Date) return new Date(value.getTime() + 1);
  if (value === null) return 'x';
  if (typeof value === 'string') return flipped(value);
  return { ...(value as object), forged: true };
}

/** Text with its last character replaced. */
const flipped = (text: string): string =>
  text === '' ? 'x' : text.slice(0, -1) + (text.endsWith('0') ? '1' : '0');
