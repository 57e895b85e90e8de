import { sessions } from '@ligament/domain/schema/people';
import { cookieOf, givePassword, GOOD_PASSWORD } from '../../support/passwords';
import { as, testPlant, type TestPerson, type TestPlant } from '../../support/test-plant';

describe('sessions', () => {
  let plant: TestPlant;
  let planner: TestPerson;

  beforeAll(async () => {
    plant = await testPlant();
    planner = plant.planner;
    await givePassword(plant, planner);
  }, 60_000);
  afterAll(() => plant.close());

  const signIn = (carrying: TestPerson | null = null) =>
    as(plant.app, carrying)
      .post('/api/session')
      .send({ email: planner.email, password: GOOD_PASSWORD });
  const withCookie = (cookie: string) => as(plant.app, { ...planner, cookie });

  it('opens a session whose cookie only this host, over TLS, and no script can read', async () => {
    const answer = await signIn();
    expect(answer.status).toBe(201);
    const set = String(answer.headers['set-cookie']);
    expect(set).toMatch(/^__Host-ligament=[a-z0-9]{40};/);
    for (const part of ['HttpOnly', 'Secure', 'SameSite=Strict', 'Path=/'])
      expect(set).toContain(part);
    expect(set).not.toMatch(/Domain=/i);
    expect(answer.body.user).toMatchObject({ id: planner.id, role: 'planner' });
    const seen = await withCookie(cookieOf(answer)).get('/api/session');
    expect(seen.body.user.email).toBe(planner.email);
  });

  it('gives a new identifier at sign-in and ends the one that was carried', async () => {
    const first = cookieOf(await signIn());
    const second = cookieOf(await signIn({ ...planner, cookie: first }));
    expect(second).not.toBe(first);
    expect((await withCookie(first).get('/api/session')).status).toBe(401);
    expect((await withCookie(second).get('/api/session')).status).toBe(200);
  });

  it('keeps nothing in the database with which one could sign in', async () => {
    const cookie = cookieOf(await signIn());
    const value = cookie.split('=')[1] ?? '';
    const rows = await plant.db.select().from(sessions);
    expect(JSON.stringify(rows)).not.toContain(value);
    for (const row of rows) {
      const answer = await withCookie(`__Host-ligament=${row.id}`).get('/api/session');
      expect(answer.status).toBe(401);
    }
  });
});
