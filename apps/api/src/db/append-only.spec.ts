import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { PGlite } from '@electric-sql/pglite';
import { migratedDumpFile } from './open-memory-database';

/** The database as its owner sees it, who has every right. */
let owner: PGlite;
const id = randomUUID();

beforeAll(async () => {
  const dump = readFileSync(await migratedDumpFile());
  owner = await PGlite.create({ loadDataDir: new Blob([dump]) });
  await dropForeignKeys();
  await owner.query(
    `insert into history (site_id, at, actor_name, actor_role, action, entity, entity_id, summary, previous_hash, hash)
     values ($1, now(), 'A', 'engineer', 'flaw.resized', 'flaw', $1, 'Resized', '', 'h')`,
    [id],
  );
  await owner.query(
    `insert into signatures (site_id, entity, entity_id, content_hash, person_id, person_name, role, meaning, signed_at)
     values ($1, 'assessment', $1, 'h', $1, 'A', 'engineer', 'authored', now())`,
    [id],
  );
}, 60_000);
afterAll(() => owner.close());

/** What is tried here needs no plant around it. */
async function dropForeignKeys(): Promise<void> {
  const { rows } = await owner.query<{ table: string; name: string }>(
    `select conrelid::regclass::text as table, conname as name from pg_constraint where contype = 'f'`,
  );
  for (const { table, name } of rows) {
    await owner.exec(`alter table ${table} drop constraint "${name}"`);
  }
}

async function addAssessment(state: string): Promise<string> {
  const key = randomUUID();
  await owner.query(
    `insert into assessments (id, site_id, flaw_id, finding_id, revision, state, inspected_on, input, outcome, engine_version,
       rule_version_id, content_hash, author_id, editor_ids)
     values ($1, $2, $1, $2, 1, $3, '2026-12-01', '{}', '{}', '1', $2, 'h', $2, '[]')`,
    [key, id, state],
  );
  return key;
}

describe('history and signatures', () => {
  it.each([
    'update history set summary = summary',
    'delete from history',
    'truncate history',
    'update signatures set comment = comment',
    'delete from signatures',
    'truncate signatures',
  ])('refuse even their owner: %s', async (statement) => {
    await expect(owner.exec(statement)).rejects.toMatchObject({
      code: '23001',
      message: expect.stringMatching(/^(history|signatures) is append-only$/),
    });
  });
});

describe('an approved assessment', () => {
  it.each([
    `update assessments set outcome = '{"life": 99}' where id = $1`,
    `update assessments set chosen_due_on = '2040-01-01' where id = $1`,
    `update assessments set state = 'draft' where id = $1`,
    `update assessments set state = 'superseded', content_hash = 'other' where id = $1`,
    'delete from assessments where id = $1',
  ])('never changes: %s', async (statement) => {
    const approved = await addAssessment('approved');
    await expect(owner.query(statement, [approved])).rejects.toMatchObject({ code: '23001' });
  });

  it('becomes superseded, and stays so', async () => {
    const approved = await addAssessment('approved');
    const setState = (state: string) =>
      owner.query('update assessments set state = $2, version = version + 1 where id = $1', [
        approved,
        state,
      ]);
    await setState('superseded');
    await expect(setState('approved')).rejects.toMatchObject({ code: '23001' });
    const { rows } = await owner.query('select state from assessments where id = $1', [approved]);
    expect(rows).toEqual([{ state: 'superseded' }]);
  });

  it('may be changed while it is a draft', async () => {
    const draft = await addAssessment('draft');
    await owner.query(`update assessments set conclusion = 'Fit for service' where id = $1`, [
      draft,
    ]);
    const { rows } = await owner.query('select conclusion from assessments where id = $1', [draft]);
    expect(rows).toEqual([{ conclusion: 'Fit for service' }]);
  });
});

describe('the tables', () => {
  it('bound every number from below and above, since NaN and Infinity pass one bound alone', async () => {
    const { rows } = await owner.query<{ place: string; checks: string }>(
      `select c.relname || '.' || a.attname as place,
         coalesce(string_agg(pg_get_constraintdef(k.oid), ' '), '') as checks
       from pg_attribute a join pg_class c on c.oid = a.attrelid and c.relkind = 'r'
       left join pg_constraint k on k.conrelid = c.oid and k.contype = 'c' and a.attnum = any (k.conkey)
       where c.relnamespace = 'public'::regnamespace and a.atttypid in ('float8'::regtype, 'float4'::regtype, 'numeric'::regtype)
         and not a.attisdropped
       group by 1`,
    );
    expect(rows.length).toBeGreaterThan(30);
    const open = rows.filter(({ checks }) => !checks.includes('>=') || !checks.includes('<='));
    expect(open.map(({ place }) => place)).toEqual([]);
  });

  it('give the application no right to change history or signatures, and no right above them', async () => {
    const { rows } = await owner.query<{ table: string; rights: string[] }>(
      `select table_name as table, array_agg(privilege_type::text order by privilege_type) as rights
       from information_schema.role_table_grants
       where grantee = 'ligament_app' and table_name in ('history', 'signatures', 'flaws') group by 1 order by 1`,
    );
    expect(rows).toEqual([
      { table: 'flaws', rights: ['DELETE', 'INSERT', 'SELECT', 'UPDATE'] },
      { table: 'history', rights: ['INSERT', 'SELECT'] },
      { table: 'signatures', rights: ['INSERT', 'SELECT'] },
    ]);
    const { rows: roles } = await owner.query(
      `select rolsuper, rolcreaterole, rolcreatedb, rolcanlogin from pg_roles where rolname = 'ligament_app'`,
    );
    expect(roles).toEqual([
      { rolsuper: false, rolcreaterole: false, rolcreatedb: false, rolcanlogin: false },
    ]);
  });
});
