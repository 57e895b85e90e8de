import { oneTimeTokens, people, sessions } from '@ligament/domain/schema/people';
import { outgoingMails } from '@ligament/domain/schema/schedule';
import { GROWTH_LAWS } from '@ligament/domain/materials/growth-laws';
import { growthLaws } from '@ligament/domain/schema/materials';
import { history } from '@ligament/domain/schema/history';
import { desc, eq } from 'drizzle-orm';
import { pino } from 'pino';
import { createApp } from '../../../apps/api/src/app';
import { settableClock } from '../../../apps/api/src/clock';
import { readConfig } from '../../../apps/api/src/config';
import { openMemoryDatabase } from '../../../apps/api/src/db/open-memory-database';
import type { Deps } from '../../../apps/api/src/deps';
import { issueSetUpToken } from '../../../apps/api/src/modules/auth/issue-set-up-token';
import { cookieOf, givePassword, GOOD_PASSWORD } from '../../support/passwords';
import { as, ORIGIN, testPlant, type TestPlant } from '../../support/test-plant';

const HOUR = 3_600_000;
const SITE = {
  siteName: 'Marsh End Works',
  siteCode: 'MEND',
  timeZone: 'Europe/London',
  name: 'First Keeper',
  email: 'first.keeper@example.org',
  password: GOOD_PASSWORD,
};

describe('the first administrator', () => {
  let memory: Awaited<ReturnType<typeof openMemoryDatabase>>;
  let deps: Deps;
  const clock = settableClock(new Date('2026-12-01T09:00:00Z'));

  beforeAll(async () => {
    memory = await openMemoryDatabase();
    deps = {
      db: memory.db,
      clock,
      config: readConfig({ LIGAMENT_PUBLIC_URL: ORIGIN, LIGAMENT_LOG: 'silent' }),
      log: pino({ level: 'silent' }),
      databaseHealthy: () => true,
    };
  }, 60_000);
  afterAll(() => memory.close());

  const door = () => as(createApp(deps, 'dist/client').app, null);
  const token = async () => (await issueSetUpToken(deps)) ?? '';

  it('is nobody by default', async () => {
    expect(await memory.db.select().from(people)).toEqual([]);
    expect((await door().get('/api/setup')).body).toEqual({ needed: true });
  });

  it('is created with a token kept only as a hash, which a newer one replaces and a day ends', async () => {
    const first = await token();
    const rows = JSON.stringify(await memory.db.select().from(oneTimeTokens));
    expect(rows).not.toContain(first);
    const second = await token();
    expect(
      (
        await door()
          .post('/api/setup')
          .send({ ...SITE, token: first })
      ).status,
    ).toBe(410);
    clock.set(new Date(clock.now().getTime() + 24 * HOUR));
    expect(
      (
        await door()
          .post('/api/setup')
          .send({ ...SITE, token: second })
      ).status,
    ).toBe(410);
  });

  it('chooses a password nobody guesses and a time zone that exists', async () => {
    const valid = await token();
    const weak = await door()
      .post('/api/setup')
      .send({ ...SITE, token: valid, password: 'marsh end works 1' });
    expect(weak.body.errors[0].field).toBe('password');
    const zone = await door()
      .post('/api/setup')
      .send({ ...SITE, token: valid, timeZone: 'Marsh/End' });
    expect(zone.body.errors[0].field).toBe('timeZone');
  });

  it('opens the site with its first rules, is signed in, and cannot be created twice', async () => {
    const [valid, app] = [await token(), door()];
    const twice = await Promise.all([
      app.post('/api/setup').send({ ...SITE, token: valid }),
      app.post('/api/setup').send({ ...SITE, token: valid }),
    ]);
    expect(twice.map(({ status }) => status).sort()).toEqual([201, 410]);
    const done = twice.find(({ status }) => status === 201);
    expect(done?.body).toMatchObject({ user: { role: 'administrator' }, site: { code: 'MEND' } });
    const cookie = done ? cookieOf(done) : '';
    const person = { id: '', name: '', email: '', role: 'administrator', cookie } as const;
    const rules = await as(createApp(deps, 'dist/client').app, person).get('/api/site-rules');
    expect(rules.body.current.number).toBe(1);
    expect((await memory.db.select().from(growthLaws)).length).toBe(GROWTH_LAWS.length);
    expect((await door().get('/api/setup')).body).toEqual({ needed: false });
    expect(await issueSetUpToken(deps)).toBeNull();
    const actions = (await memory.db.select().from(history)).map((entry) => entry.action);
    expect(actions).toEqual(
      expect.arrayContaining(['site.opened', 'site-rules.recorded', 'person.created']),
    );
  });
});

describe('a forgotten password', () => {
  let plant: TestPlant;
  beforeAll(async () => {
    plant = await testPlant();
    await givePassword(plant, plant.planner);
  }, 60_000);
  afterAll(() => plant.close());

  const door = () => as(plant.app, null);
  const ask = (email: string) => door().post('/api/password-resets').send({ email });
  const mailedToken = async () => {
    const [mail] = await plant.db
      .select()
      .from(outgoingMails)
      .where(eq(outgoingMails.recipient, plant.planner.email))
      .orderBy(desc(outgoingMails.createdAt));
    return /\/reset-password\/(\S+)/.exec(mail?.text ?? '')?.[1] ?? '';
  };
  const later = (milliseconds: number) =>
    plant.clock.set(new Date(plant.clock.now().getTime() + milliseconds));

  it('is answered alike, in words and time, for an address nobody has', async () => {
    const timed = async (email: string) => {
      const start = performance.now();
      const { status, body } = await ask(email);
      return { status, body: body as unknown, time: performance.now() - start };
    };
    const [known, unknown] = [await timed(plant.planner.email), await timed('nobody@example.org')];
    expect(known.status).toBe(202);
    expect({ ...unknown, time: 0 }).toEqual({ ...known, time: 0 });
    expect(Math.min(known.time, unknown.time)).toBeGreaterThan(195);
    expect(await plant.db.select().from(outgoingMails)).toHaveLength(1);
  });

  it('is replaced with a mailed token that works once and ends every session', async () => {
    later(1000);
    await ask(plant.planner.email);
    const token = await mailedToken();
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    expect(JSON.stringify(await plant.db.select().from(oneTimeTokens))).not.toContain(token);
    const weak = await door()
      .post(`/api/password-resets/${token}`)
      .send({ password: 'passwordpassword1' });
    expect(weak.status).toBe(422);
    const next = { password: 'four herons stand in the ebb' };
    expect((await door().post(`/api/password-resets/${token}`).send(next)).status).toBe(204);
    const open = await plant.db
      .select()
      .from(sessions)
      .where(eq(sessions.userId, plant.planner.id));
    expect(open).toEqual([]);
    expect((await door().post(`/api/password-resets/${token}`).send(next)).status).toBe(410);
    const signedIn = await door()
      .post('/api/session')
      .send({ email: plant.planner.email, ...next });
    expect(signedIn.status).toBe(201);
    const [entry] = await plant.db.select().from(history).orderBy(desc(history.seq)).limit(1);
    expect(entry).toMatchObject({ action: 'person.password-reset', actorId: plant.planner.id });
    expect(JSON.stringify(entry)).not.toContain('argon2');
  });

  it('cannot be replaced after half an hour, nor with the link of an earlier mail', async () => {
    later(1000);
    await ask(plant.planner.email);
    const earlier = await mailedToken();
    later(1000);
    await ask(plant.planner.email);
    const latest = await mailedToken();
    const next = { password: 'four herons stand in the ebb' };
    expect((await door().post(`/api/password-resets/${earlier}`).send(next)).status).toBe(410);
    later(30 * 60_000);
    expect((await door().post(`/api/password-resets/${latest}`).send(next)).status).toBe(410);
  });

  it('lifts a lock, so that no stranger can keep anybody out for good', async () => {
    await plant.db
      .update(people)
      .set({ failedSignIns: 9, lockedUntil: new Date(plant.clock.now().getTime() + HOUR) })
      .where(eq(people.id, plant.planner.id));
    later(1000);
    await ask(plant.planner.email);
    const next = { password: 'two ferries pass at midday' };
    const token = await mailedToken();
    expect((await door().post(`/api/password-resets/${token}`).send(next)).status).toBe(204);
    const signedIn = await door()
      .post('/api/session')
      .send({ email: plant.planner.email, ...next });
    expect(signedIn.status).toBe(201);
  });

  it('floods nobody’s mailbox: at most five mails an hour, with the same answer', async () => {
    later(HOUR);
    const before = (await plant.db.select().from(outgoingMails)).length;
    for (let n = 0; n < 7; n += 1) expect((await ask(plant.planner.email)).status).toBe(202);
    expect(await plant.db.select().from(outgoingMails)).toHaveLength(before + 5);
  });
});
