import { sessions } from '@ligament/domain/schema/people';
import { eq } from 'drizzle-orm';
import { cookieOf, givePassword, GOOD_PASSWORD } from '../../support/passwords';
import { as, testPlant, type TestPerson, type TestPlant } from '../../support/test-plant';

const HOUR = 3_600_000;

describe('sessions', () => {
  let plant: TestPlant;
  let planner: TestPerson;
  const start = new Date('2026-12-01T09:00:00Z');

  beforeAll(async () => {
    plant = await testPlant(start);
    planner = plant.planner;
    await givePassword(plant, planner);
  }, 60_000);
  beforeEach(() => plant.clock.set(start));
  afterAll(() => plant.close());

  const signIn = (carrying: TestPerson | null = null) =>
    as(plant.app, carrying)
      .post('/api/session')
      .send({ email: planner.email, password: GOOD_PASSWORD });
  const withCookie = (cookie: string) => as(plant.app, { ...planner, cookie });
  const statusAt = async (cookie: string, milliseconds: number) => {
    plant.clock.set(new Date(start.getTime() + milliseconds));
    return (await withCookie(cookie).get('/api/session')).status;
  };

  it('open with a cookie that only this host, over TLS, and no script can read', async () => {
    const answer = await signIn();
    expect(answer.status).toBe(201);
    const set = String(answer.headers['set-cookie']);
    expect(set).toMatch(/^__Host-ligament=[a-z0-9]{40};/);
    for (const part of ['HttpOnly', 'Secure', 'SameSite=Strict', 'Path=/']) {
      expect(set).toContain(part);
    }
    expect(set).not.toMatch(/Domain=/i);
    const seen = await withCookie(cookieOf(answer)).get('/api/session');
    expect(seen.body).toMatchObject({
      user: { id: planner.id, role: 'planner' },
      site: { code: 'SALT', timeZone: 'Europe/London' },
      expiresAt: '2026-12-01T17:00:00.000Z',
    });
  });

  it('get a new identifier at sign-in, and the one carried before ends', async () => {
    const first = cookieOf(await signIn());
    const second = cookieOf(await signIn({ ...planner, cookie: first }));
    expect(second).not.toBe(first);
    expect((await withCookie(first).get('/api/session')).status).toBe(401);
    expect((await withCookie(second).get('/api/session')).status).toBe(200);
  });

  it('leave nothing in the database with which one could sign in', async () => {
    const cookie = cookieOf(await signIn());
    const value = cookie.split('=')[1] ?? '';
    const rows = await plant.db.select().from(sessions);
    expect(JSON.stringify(rows)).not.toContain(value);
    for (const row of rows) {
      const answer = await withCookie(`__Host-ligament=${row.id}`).get('/api/session');
      expect(answer.status).toBe(401);
    }
  });

  it('end when idle for eight hours, to the second', async () => {
    const cookie = cookieOf(await signIn());
    expect(await statusAt(cookie, 8 * HOUR)).toBe(401);
    plant.clock.set(start);
    const other = cookieOf(await signIn());
    expect(await statusAt(other, 8 * HOUR - 1000)).toBe(200);
  });

  it('end after twelve hours however busy', async () => {
    const cookie = cookieOf(await signIn());
    for (const hour of [4, 8, 11]) expect(await statusAt(cookie, hour * HOUR)).toBe(200);
    expect(await statusAt(cookie, 12 * HOUR - 1000)).toBe(200);
    expect(await statusAt(cookie, 12 * HOUR)).toBe(401);
  });

  it('note when they were last used, at most once a minute', async () => {
    const cookie = cookieOf(await signIn());
    const lastSeen = async () => {
      const { body } = await withCookie(cookie).get('/api/sessions');
      return (body.rows as { current: boolean; lastSeenAt: string }[]).find((row) => row.current)
        ?.lastSeenAt;
    };
    plant.clock.set(new Date(start.getTime() + 59_000));
    expect(await lastSeen()).toBe(start.toISOString());
    plant.clock.set(new Date(start.getTime() + 60_000));
    expect(await lastSeen()).toBe('2026-12-01T09:01:00.000Z');
  });

  it('end at sign-out, and the browser is told to forget', async () => {
    const cookie = cookieOf(await signIn());
    const out = await withCookie(cookie).delete('/api/session');
    expect(out.status).toBe(204);
    expect(out.headers['clear-site-data']).toContain('"storage"');
    expect(String(out.headers['set-cookie'])).toMatch(/^__Host-ligament=; .*Max-Age=0/);
    expect((await withCookie(cookie).get('/api/session')).status).toBe(401);
  });

  it('are listed for their owner, who can end any of them but nobody else’s', async () => {
    const [here, there] = [cookieOf(await signIn()), cookieOf(await signIn())];
    const { body } = await withCookie(here).get('/api/sessions');
    const rows = body.rows as { id: string; current: boolean }[];
    expect(rows.filter((row) => row.current)).toHaveLength(1);
    const foreign = await as(plant.app, plant.engineer).delete(`/api/sessions/${rows[0]?.id}`);
    expect(foreign.status).toBe(404);
    for (const row of rows.filter((each) => !each.current)) {
      expect((await withCookie(here).delete(`/api/sessions/${row.id}`)).status).toBe(204);
    }
    expect((await withCookie(there).get('/api/session')).status).toBe(401);
    expect((await withCookie(here).get('/api/session')).status).toBe(200);
  });

  it('all end when the password changes, but the browser that changed it goes on under a new one', async () => {
    const [here, there] = [cookieOf(await signIn()), cookieOf(await signIn())];
    const next = 'nine otters crossed the weir';
    const wrong = await withCookie(here)
      .post('/api/session/password')
      .send({ current: 'not it at all', next });
    expect(wrong.status).toBe(422);
    expect(wrong.body.errors[0].field).toBe('current');
    const weak = await withCookie(here)
      .post('/api/session/password')
      .send({ current: GOOD_PASSWORD, next: 'ligament is my password' });
    expect(weak.body.errors[0].field).toBe('next');
    const changed = await withCookie(here)
      .post('/api/session/password')
      .send({ current: GOOD_PASSWORD, next });
    expect(changed.status).toBe(204);
    const renewed = cookieOf(changed);
    for (const old of [here, there]) {
      expect((await withCookie(old).get('/api/session')).status).toBe(401);
    }
    expect((await withCookie(renewed).get('/api/session')).status).toBe(200);
    await givePassword(plant, planner);
  });

  it('carry the proof of a password given again, for five minutes', async () => {
    const cookie = cookieOf(await signIn());
    const proved = async () => {
      const [row] = await plant.db
        .select()
        .from(sessions)
        .where(eq(sessions.userId, planner.id))
        .orderBy(sessions.provedAt);
      return row;
    };
    await plant.db.delete(sessions).where(eq(sessions.userId, planner.id));
    expect(await proved()).toBeUndefined();
    const fresh = cookieOf(await signIn());
    expect(fresh).not.toBe(cookie);
    plant.clock.set(new Date(start.getTime() + 6 * 60_000));
    const wrong = await withCookie(fresh)
      .post('/api/session/proof')
      .send({ password: 'not the one' });
    expect(wrong.status).toBe(422);
    expect((await proved())?.provedAt).toEqual(start);
    const right = await withCookie(fresh)
      .post('/api/session/proof')
      .send({ password: GOOD_PASSWORD });
    expect(right.status).toBe(204);
    expect((await proved())?.provedAt).toEqual(plant.clock.now());
  });

  it('never repeat an identifier', async () => {
    const { generateIdFromEntropySize } = await import('lucia');
    const ids = new Set(Array.from({ length: 20_000 }, () => generateIdFromEntropySize(25)));
    expect(ids.size).toBe(20_000);
  });
});
