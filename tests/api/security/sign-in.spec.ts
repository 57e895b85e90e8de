import { people, throttles } from '@ligament/domain/schema/people';
import { eq } from 'drizzle-orm';
import { createApp } from '../../../apps/api/src/app';
import { lockMilliseconds } from '../../../apps/api/src/modules/auth/lock-out';
import { givePassword, GOOD_PASSWORD } from '../../support/passwords';
import { as, testPlant, type TestPerson, type TestPlant } from '../../support/test-plant';

const MINUTE = 60_000;

describe('the door', () => {
  let plant: TestPlant;
  let known: TestPerson;
  let disabled: TestPerson;

  beforeAll(async () => {
    plant = await testPlant();
    known = await plant.person('planner', 'Known Person');
    disabled = await plant.person('planner', 'Disabled Person');
    for (const person of [known, disabled]) await givePassword(plant, person);
    await plant.db.update(people).set({ active: false }).where(eq(people.id, disabled.id));
  }, 60_000);
  beforeEach(async () => {
    await plant.db.delete(throttles);
    await plant.db.update(people).set({ failedSignIns: 0, lockedUntil: null });
  });
  afterAll(() => plant.close());

  const wait = (milliseconds: number) =>
    plant.clock.set(new Date(plant.clock.now().getTime() + milliseconds));
  const enter = (email: string, password: string, app = plant.app) =>
    as(app, null).post('/api/session').send({ email, password });

  it('answers alike to a wrong password, an unknown, a disabled and an uninvited person', async () => {
    const uninvited = plant.inspector;
    const answers = [
      await enter(known.email, 'a wrong password it is'),
      await enter('nobody@example.org', GOOD_PASSWORD),
      await enter(disabled.email, GOOD_PASSWORD),
      await enter(uninvited.email, GOOD_PASSWORD),
    ];
    const seen = answers.map(({ status, body }) => ({ status, ...body, instance: '' }));
    for (const each of seen) expect(each).toEqual(seen[0]);
    expect(seen[0]?.status).toBe(401);
  });

  // the processor's work is counted, not the clock's time, which on a busy machine tells of its neighbours
  it('does the same work for all of them', async () => {
    const work: Record<string, number[]> = { known: [], unknown: [], disabled: [] };
    const emails = { known: known.email, unknown: 'nobody@example.org', disabled: disabled.email };
    for (let round = 0; round < 15; round += 1) {
      for (const [name, email] of Object.entries(emails)) {
        // past every lock, so that each try is looked at
        wait(16 * MINUTE);
        const before = process.cpuUsage();
        const { status } = await enter(email, 'a wrong password it is');
        const { user, system } = process.cpuUsage(before);
        work[name]?.push(user + system);
        expect(status).toBe(401);
      }
    }
    // a door that skips the comparison of passwords, or makes it twice, is far outside
    const usual = median(work['known'] ?? []);
    for (const kind of ['unknown', 'disabled']) {
      const share = median(work[kind] ?? []) / usual;
      expect(share).toBeGreaterThan(0.6);
      expect(share).toBeLessThan(1.6);
    }
  }, 60_000);

  it('locks an account longer with each failure from the fifth on, at most 15 minutes', () => {
    const seconds = [1, 4, 5, 6, 7, 8, 9, 10, 11, 500].map((n) => lockMilliseconds(n) / 1000);
    expect(seconds).toEqual([0, 0, 30, 60, 120, 240, 480, 900, 900, 900]);
  });

  it.each(['known', 'unknown'])(
    'locks after five failures, even for the right password: %s',
    async (kind) => {
      const email = kind === 'known' ? known.email : 'nobody.here@example.org';
      for (let n = 0; n < 5; n += 1)
        expect((await enter(email, 'a wrong password it is')).status).toBe(401);
      const locked = await enter(email, GOOD_PASSWORD);
      expect(locked.status).toBe(429);
      expect(locked.headers['retry-after']).toBe('30');
      wait(29_999);
      expect((await enter(email, GOOD_PASSWORD)).status).toBe(429);
      wait(1);
      expect((await enter(email, GOOD_PASSWORD)).status).toBe(kind === 'known' ? 201 : 401);
    },
  );

  it('keeps the lock over a restart and lets everybody else in', async () => {
    await givePassword(plant, plant.engineer);
    for (let n = 0; n < 5; n += 1) await enter(known.email, 'a wrong password it is');
    const restarted = createApp(plant.deps, 'dist/client').app;
    expect((await enter(known.email, GOOD_PASSWORD, restarted)).status).toBe(429);
    expect((await enter(plant.engineer.email, GOOD_PASSWORD, restarted)).status).toBe(201);
  });

  it('lets many tries at once count as many', async () => {
    await Promise.all(
      Array.from({ length: 8 }, () => enter(known.email, 'a wrong password it is')),
    );
    const [row] = await plant.db.select().from(people).where(eq(people.id, known.id));
    expect(row?.failedSignIns).toBeGreaterThanOrEqual(5);
    expect((await enter(known.email, GOOD_PASSWORD)).status).toBe(429);
  });

  it('starts counting anew after a success', async () => {
    for (let n = 0; n < 4; n += 1) await enter(known.email, 'a wrong password it is');
    expect((await enter(known.email, GOOD_PASSWORD)).status).toBe(201);
    for (let n = 0; n < 4; n += 1) await enter(known.email, 'a wrong password it is');
    expect((await enter(known.email, GOOD_PASSWORD)).status).toBe(201);
  });

  it('refuses a network address after a hundred failures in a quarter of an hour', async () => {
    await enter('nobody@example.org', 'a wrong password it is');
    await plant.db.update(throttles).set({ failures: 100 });
    const limited = await enter(known.email, GOOD_PASSWORD);
    expect(limited.status).toBe(429);
    expect(limited.body.type).toContain('address-limited');
    wait(15 * MINUTE);
    expect((await enter(known.email, GOOD_PASSWORD)).status).toBe(201);
  });

  it('believes a forwarded address only where a proxy is configured', async () => {
    const addressOf = async (app: TestPlant['app']) => {
      await plant.db.delete(throttles);
      const call = enter('nobody@example.org', 'a wrong password it is', app);
      await call.set('X-Forwarded-For', '203.0.113.9');
      const rows = await plant.db.select().from(throttles);
      return rows.map((row) => row.key).filter((key) => key.startsWith('address:'));
    };
    const { config } = plant.deps;
    const behindProxy = createApp(
      { ...plant.deps, config: { ...config, trustProxy: true } },
      'dist/client',
    ).app;
    const [direct] = await addressOf(plant.app);
    const [forwarded] = await addressOf(behindProxy);
    expect(direct).toBeDefined();
    expect(forwarded).not.toBe(direct);
    const forgedAgain = enter('nobody@example.org', 'a wrong password it is').set(
      'X-Forwarded-For',
      '198.51.100.1',
    );
    await plant.db.delete(throttles);
    await forgedAgain;
    const rows = await plant.db.select().from(throttles);
    expect(rows.map((row) => row.key)).toContain(direct);
  });

  it('turns away a flood instead of letting it take the machine', async () => {
    const statuses = await Promise.all(
      Array.from(
        { length: 70 },
        async (_, n) => (await enter(`flood.${n}@example.org`, 'a wrong password it is')).status,
      ),
    );
    expect(statuses.filter((status) => status === 429).length).toBeGreaterThanOrEqual(10);
    expect(statuses.filter((status) => status === 401).length).toBeGreaterThanOrEqual(50);
  }, 60_000);
});

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? 0;
}
