import { people } from '@ligament/domain/schema/people';
import { eq } from 'drizzle-orm';
import request from 'supertest';
import { givePassword, GOOD_PASSWORD } from '../../support/passwords';
import { as, ORIGIN, testPlant, type TestPlant } from '../../support/test-plant';

describe('requests from elsewhere and out of shape', () => {
  let plant: TestPlant;
  beforeAll(async () => {
    plant = await testPlant();
    await givePassword(plant, plant.administrator);
  }, 60_000);
  afterAll(() => plant.close());

  const INVITATION = { name: 'Some One', email: 'some.one@example.org', role: 'planner' };
  const raw = (headers: Record<string, string>, body: string | object = INVITATION) =>
    request(plant.app)
      .post('/api/users')
      .set('Cookie', plant.administrator.cookie)
      .set(headers)
      .send(body);

  it.each([
    [
      'another site by fetch metadata',
      { 'Sec-Fetch-Site': 'cross-site', Origin: 'https://evil.example' },
    ],
    ['a sub-domain', { 'Sec-Fetch-Site': 'same-site', Origin: 'http://sub.localhost:4300' }],
    ['typed into the address bar', { 'Sec-Fetch-Site': 'none' }],
    ['another origin of an old browser', { Origin: 'https://evil.example' }],
    ['another port', { Origin: 'http://localhost:9999' }],
    ['an opaque origin', { Origin: 'null' }],
    ['no sign of where it comes from', {}],
    [
      'same-origin claimed with a foreign Origin',
      { 'Sec-Fetch-Site': 'same-origin', Origin: 'https://evil.example' },
    ],
  ])('are refused and change nothing: %s', async (_name, headers) => {
    const answer = await raw({ 'X-Requested-With': 'ligament', ...headers });
    expect(answer.status).toBe(403);
    const rows = await plant.db.select().from(people).where(eq(people.email, INVITATION.email));
    expect(rows).toEqual([]);
  });

  it.each([
    ['text/plain', JSON.stringify(INVITATION)],
    ['application/x-www-form-urlencoded', 'name=Some+One&email=some.one@example.org&role=planner'],
    ['multipart/form-data; boundary=x', '--x--'],
  ])('are refused when a plain form could have sent them: %s', async (type, body) => {
    const answer = await raw({ 'Sec-Fetch-Site': 'same-origin', 'Content-Type': type }, body);
    expect(answer.status).toBe(403);
  });

  it('are taken from our own pages, by either sign', async () => {
    const modern = await raw(
      { 'Sec-Fetch-Site': 'same-origin' },
      { ...INVITATION, email: 'a@example.org' },
    );
    const older = await raw({ Origin: ORIGIN }, { ...INVITATION, email: 'b@example.org' });
    expect([modern.status, older.status]).toEqual([201, 201]);
  });

  it('get no permission to read from another origin', async () => {
    const answers = [
      await request(plant.app)
        .get('/api/session')
        .set('Origin', 'https://evil.example')
        .set('Cookie', plant.planner.cookie),
      await request(plant.app)
        .options('/api/session')
        .set('Origin', 'https://evil.example')
        .set('Access-Control-Request-Method', 'DELETE'),
    ];
    for (const { headers } of answers) {
      expect(Object.keys(headers).filter((name) => name.startsWith('access-control-'))).toEqual([]);
    }
  });

  it('are limited in size to the byte, in depth and in rows', async () => {
    const admin = as(plant.app, plant.administrator);
    const sized = (bytes: number) => {
      const frame = JSON.stringify({ ...INVITATION, name: '' }).length;
      return JSON.stringify({ ...INVITATION, name: 'x'.repeat(bytes - frame) });
    };
    const limit = 256 * 1024;
    const json = { 'Sec-Fetch-Site': 'same-origin', 'Content-Type': 'application/json' };
    expect((await raw(json, sized(limit))).body.errors[0].field).toBe('name');
    expect((await raw(json, sized(limit + 1))).status).toBe(413);
    const nested = (levels: number): object => (levels === 0 ? {} : { in: nested(levels - 1) });
    const deep = await raw(json, JSON.stringify(nested(30)));
    expect(deep.body.type).toContain('body.too-deep');
    expect((await admin.get('/api/users').query({ limit: 200 })).status).toBe(200);
    expect((await admin.get('/api/users').query({ limit: 201 })).status).toBe(400);
    expect((await admin.get('/api/users?limit=5&limit=6')).status).toBe(400);
    expect((await admin.get('/api/users?limit[a]=5')).status).toBe(400);
    expect((await raw(json, '{"name": ')).status).toBe(400);
  });

  it('cannot reach prototypes', async () => {
    const json = { 'Sec-Fetch-Site': 'same-origin', 'Content-Type': 'application/json' };
    for (const key of ['__proto__', 'constructor', 'prototype']) {
      await raw(
        json,
        `{"${key}": {"polluted": true}, "name": "P", "email": "p@example.org", "role": "planner"}`,
      );
      await as(plant.app, plant.administrator).get(`/api/users?${key}=x`);
      expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
    }
  });

  it('of unknown methods are answered 405 with the ones that work', async () => {
    const admin = as(plant.app, plant.administrator);
    const put = await admin.put('/api/users').send({});
    expect(put.status).toBe(405);
    expect(put.headers['allow']).toBe('GET, POST');
    const trace = await request(plant.app)
      .trace('/api/session')
      .set('Sec-Fetch-Site', 'same-origin')
      .set('X-Requested-With', 'ligament');
    expect(trace.status).toBe(405);
    expect((await admin.get('/api/nowhere')).status).toBe(404);
  });

  it('that are repeated with the same key do their work once', async () => {
    const admin = as(plant.app, plant.administrator);
    const body = { ...INVITATION, email: 'once@example.org' };
    const send = (more: object = {}) =>
      admin
        .post('/api/users')
        .set('Idempotency-Key', 'key-00000001')
        .send({ ...body, ...more });
    const clicks = await Promise.all([send(), send(), send()]);
    expect(clicks.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(new Set(clicks.map((click) => click.body.id as string)).size).toBe(1);
    expect((await send()).body.id).toBe(clicks[0]?.body.id);
    expect((await send({ name: 'Another' })).status).toBe(422);
    expect((await admin.post('/api/users').set('Idempotency-Key', 'x').send(body)).status).toBe(
      400,
    );
  });

  it('of fifty writers at once change a record once', async () => {
    const target = await plant.person('planner', 'Busy Record');
    const answers = await Promise.all(
      Array.from({ length: 50 }, (_, n) =>
        as(plant.app, plant.administrator)
          .patch(`/api/users/${target.id}`)
          .set('If-Match', '"1"')
          .send({ organisation: `Writer ${n}` }),
      ),
    );
    const won = answers.filter(({ status }) => status === 200);
    expect(won).toHaveLength(1);
    for (const lost of answers.filter(({ status }) => status !== 200)) {
      expect(lost.status).toBe(412);
      expect(lost.body.current.organisation).toBe(won[0]?.body.organisation);
    }
  });

  it('cannot forge a line of the security log', async () => {
    const lines: string[] = [];
    const { pino } = await import('pino');
    const { createApp } = await import('../../../apps/api/src/app');
    const log = pino({ level: 'info' }, { write: (line: string) => lines.push(line) });
    const { app } = createApp({ ...plant.deps, log }, 'dist/client');
    const door = as(app, null);
    await door
      .post('/api/session')
      .send({ email: plant.administrator.email, password: GOOD_PASSWORD });
    await door
      .post('/api/session')
      .send({ email: 'nobody@example.org', password: 'planted\r\n{"secret":1} words' });
    await as(app, plant.planner).post('/api/users').send(INVITATION);
    const text = lines.join('');
    expect(lines.map((line) => (JSON.parse(line) as { security?: string }).security)).toEqual([
      'sign-in',
      'sign-in refused',
      'denied',
    ]);
    for (const secret of [GOOD_PASSWORD, 'planted', 'ligament='])
      expect(text).not.toContain(secret);
    expect(text).not.toContain('\r');
  });
});
