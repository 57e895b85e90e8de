import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { createApp } from '../../apps/api/src/app';
import { settableClock } from '../../apps/api/src/clock';
import { readConfig } from '../../apps/api/src/config';
import type { Database } from '../../apps/api/src/db/database';
import { openMemoryDatabase } from '../../apps/api/src/db/open-memory-database';
import type { Deps } from '../../apps/api/src/deps';
import type { Role } from '@ligament/domain/contract/policy';
import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { people, sessions } from '@ligament/domain/schema/people';
import { siteRuleVersions, sites } from '@ligament/domain/schema/sites';

export const ORIGIN = 'http://localhost:4300';

export interface TestPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly cookie: string;
}

/** An empty site on a real database, with people of every role already signed in, and a clock that stands still. */
export async function testPlant(start = new Date('2026-12-01T09:00:00Z')) {
  const memory = await openMemoryDatabase();
  const clock = settableClock(start);
  const deps: Deps = {
    db: memory.db,
    clock,
    config: readConfig({ LIGAMENT_PUBLIC_URL: ORIGIN, LIGAMENT_LOG: 'silent' }),
    log: pino({ level: process.env['LIGAMENT_TEST_LOG'] ?? 'silent' }),
    databaseHealthy: () => true,
  };
  const { app, api } = createApp(deps, 'dist/client');
  const siteId = await addSite(memory.db, 'SALT', 'Saltmere Works');
  const person = (role: Role, name = `Test ${role}`, site = siteId) =>
    addSignedIn(memory.db, clock.now(), site, role, name);
  return {
    app,
    api,
    deps,
    db: memory.db,
    clock,
    siteId,
    person,
    inspector: await person('inspector'),
    engineer: await person('engineer', 'Test author'),
    reviewer: await person('engineer', 'Test reviewer'),
    planner: await person('planner'),
    operations: await person('operations'),
    auditor: await person('auditor'),
    administrator: await person('administrator'),
    close: () => memory.close(),
  };
}

export type TestPlant = Awaited<ReturnType<typeof testPlant>>;

/** A second site in the same database shows that nobody sees another's records. */
export async function addSite(db: Database, code: string, name: string): Promise<string> {
  const id = randomUUID();
  await db.insert(sites).values({ id, code, name, timeZone: 'Europe/London' });
  await db.insert(siteRuleVersions).values({
    siteId: id,
    number: 1,
    effectiveOn: '2020-01-01',
    rules: DEFAULT_SITE_RULES,
    reason: 'Initial rules',
    createdBy: 'Test',
  });
  return id;
}

async function addSignedIn(
  db: Database,
  now: Date,
  siteId: string,
  role: Role,
  name: string,
): Promise<TestPerson> {
  const id = randomUUID();
  const email = `${name.toLowerCase().replaceAll(' ', '.')}.${id.slice(0, 8)}@example.org`;
  await db.insert(people).values({ id, siteId, name, email, role, passwordHash: null });
  const value = randomBytes(25).toString('hex').slice(0, 40);
  await db.insert(sessions).values({
    id: createHash('sha256').update(value).digest('hex'),
    userId: id,
    expiresAt: new Date(now.getTime() + 8 * 3_600_000),
    absoluteExpiresAt: new Date(now.getTime() + 12 * 3_600_000),
    createdAt: now,
    lastSeenAt: now,
    provedAt: now,
  });
  return { id, name, email, role, cookie: `__Host-ligament=${value}` };
}

/** Requests as one person, with the headers a browser of ours sends. */
export function as(app: Express, person: TestPerson | null) {
  const send = (method: 'get' | 'post' | 'patch' | 'put' | 'delete') => (path: string) => {
    const call = request(app)
      [method](path)
      .set('Origin', ORIGIN)
      .set('Sec-Fetch-Site', 'same-origin')
      .set('X-Requested-With', 'ligament');
    return person ? call.set('Cookie', person.cookie) : call;
  };
  return {
    get: send('get'),
    post: send('post'),
    patch: send('patch'),
    put: send('put'),
    delete: send('delete'),
  };
}
