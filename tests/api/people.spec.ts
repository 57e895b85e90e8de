import { history } from '@ligament/domain/schema/history';
import { outgoingMails } from '@ligament/domain/schema/schedule';
import { people } from '@ligament/domain/schema/people';
import { desc, eq } from 'drizzle-orm';
import { cookieOf, givePassword, GOOD_PASSWORD } from '../support/passwords';
import { addSite, as, testPlant, type TestPerson, type TestPlant } from '../support/test-plant';

describe('people of a site', () => {
  let plant: TestPlant;
  const admin = () => as(plant.app, plant.administrator);

  beforeAll(async () => {
    plant = await testPlant();
  }, 60_000);
  afterAll(() => plant.close());

  const lastEntry = async () => {
    const [entry] = await plant.db.select().from(history).orderBy(desc(history.seq)).limit(1);
    return entry;
  };
  const invite = (email: string, more: Record<string, unknown> = {}) =>
    admin()
      .post('/api/users')
      .send({ name: 'Wren Astley', email, role: 'planner', ...more });
  const mailTo = async (recipient: string) => {
    const mails = await plant.db
      .select()
      .from(outgoingMails)
      .where(eq(outgoingMails.recipient, recipient))
      .orderBy(desc(outgoingMails.createdAt));
    return mails;
  };
  const versionOf = async (person: TestPerson) =>
    (await admin().get(`/api/users/${person.id}`)).body.version as number;
  const change = async (person: TestPerson, body: Record<string, unknown>) =>
    admin()
      .patch(`/api/users/${person.id}`)
      .set('If-Match', `"${await versionOf(person)}"`)
      .send(body);

  it('invites a person by mail, who then chooses a password and is signed in', async () => {
    const invited = await invite('Wren.Astley@example.org', { competence: 'Turnaround planning' });
    expect(invited.status).toBe(201);
    expect(invited.body).toMatchObject({
      email: 'wren.astley@example.org',
      access: 'invited',
      version: 1,
    });
    expect(await lastEntry()).toMatchObject({
      action: 'person.invited',
      actorId: plant.administrator.id,
      after: expect.objectContaining({ role: 'planner', competence: 'Turnaround planning' }),
    });
    const [mail] = await mailTo('wren.astley@example.org');
    const token = /\/accept\/(\S+)/.exec(mail?.text ?? '')?.[1] ?? '';
    expect(mail).toMatchObject({ kind: 'invitation', state: 'queued' });
    const accepted = await as(plant.app, null)
      .post(`/api/invitations/${token}/accept`)
      .send({ name: 'Wren Astley', password: GOOD_PASSWORD });
    expect(accepted.status).toBe(201);
    expect(accepted.body.user).toMatchObject({ name: 'Wren Astley', role: 'planner' });
    expect(cookieOf(accepted)).toMatch(/^__Host-ligament=/);
    const again = await as(plant.app, null)
      .post(`/api/invitations/${token}/accept`)
      .send({ name: 'Wren Astley', password: GOOD_PASSWORD });
    expect(again.status).toBe(410);
  });

  it('replaces an earlier invitation when it is sent again, and lets one expire after 72 hours', async () => {
    const { body } = await invite('tarn@example.org', { name: 'Tarn Ollis' });
    const resent = await admin().post(`/api/users/${body.id}/invitation`).send({});
    expect(resent.status).toBe(201);
    const mails = await mailTo('tarn@example.org');
    expect(new Set(mails.map((mail) => mail.messageId)).size).toBe(2);
    const tokens = mails.map((mail) => /\/accept\/(\S+)/.exec(mail.text)?.[1] ?? '');
    const start = plant.clock.now();
    plant.clock.set(new Date(start.getTime() + 72 * 3_600_000 + 1000));
    const statuses = await Promise.all(
      tokens.map(async (token) => {
        const answer = await as(plant.app, null)
          .post(`/api/invitations/${token}/accept`)
          .send({ name: 'Tarn Ollis', password: GOOD_PASSWORD });
        return answer.status;
      }),
    );
    plant.clock.set(start);
    expect(statuses).toEqual([410, 410]);
  });

  it('refuses an address that somebody has already, naming the field', async () => {
    const answer = await invite(plant.planner.email);
    expect(answer.status).toBe(409);
    expect(answer.body.errors[0].field).toBe('email');
  });

  it('lets an administrator start but never choose a password', async () => {
    const answer = await invite('pw@example.org', { password: GOOD_PASSWORD });
    expect(answer.status).toBe(400);
    expect(JSON.stringify(answer.body.errors)).toContain('password');
    const patched = await change(plant.planner, { passwordHash: 'x' });
    expect(patched.status).toBe(400);
  });

  it('ends the sessions of whoever gets another role, at once', async () => {
    const person = await plant.person('planner', 'Moved Over');
    const changed = await change(person, { role: 'operations' });
    expect(changed.status).toBe(200);
    expect((await as(plant.app, person).get('/api/session')).status).toBe(401);
    expect(await lastEntry()).toMatchObject({
      action: 'person.role-changed',
      before: { role: 'planner' },
      after: { role: 'operations' },
    });
  });

  it('keeps the sessions of whoever only gets another organisation', async () => {
    const person = await plant.person('planner', 'Stays Here');
    await change(person, { organisation: 'Brackwater Process Ltd' });
    expect((await as(plant.app, person).get('/api/session')).status).toBe(200);
  });

  it('disables a person: no session, no sign-in', async () => {
    const person = await plant.person('inspector', 'Gone Away');
    await givePassword(plant, person);
    expect((await change(person, { active: false })).body.access).toBe('disabled');
    expect((await as(plant.app, person).get('/api/session')).status).toBe(401);
    const signIn = await as(plant.app, null)
      .post('/api/session')
      .send({ email: person.email, password: GOOD_PASSWORD });
    expect(signIn.status).toBe(401);
  });

  it('ends a visitor’s access after the last day at the site', async () => {
    const visitor = await plant.person('auditor', 'Visiting Auditor');
    await change(visitor, { accessUntil: '2026-12-02' });
    const start = plant.clock.now();
    const at = async (instant: string) => {
      plant.clock.set(new Date(instant));
      const fresh = await plant.person('auditor', 'Fresh');
      await plant.db
        .update(people)
        .set({ accessUntil: '2026-12-02' })
        .where(eq(people.id, fresh.id));
      return (await as(plant.app, fresh).get('/api/session')).status;
    };
    expect(await at('2026-12-02T23:59:59Z')).toBe(200);
    expect(await at('2026-12-03T00:00:00Z')).toBe(401);
    plant.clock.set(start);
  });

  it('never leaves a site without an administrator, nor lets one change their own role', async () => {
    const own = await change(plant.administrator, { role: 'engineer' });
    expect(own.status).toBe(403);
    const other = await plant.person('administrator', 'Second Admin');
    const asOther = as(plant.app, other);
    const version = await versionOf(plant.administrator);
    // the second one has no password yet, so the first is the last who could sign in again
    await givePassword(plant, plant.administrator);
    const last = await asOther
      .patch(`/api/users/${plant.administrator.id}`)
      .set('If-Match', `"${version}"`)
      .send({ active: false });
    expect(last.status).toBe(409);
    await givePassword(plant, other);
    const allowed = await change(other, { role: 'engineer' });
    expect(allowed.status).toBe(200);
  });

  it('refuses a change based on an outdated version and shows the current one', async () => {
    const person = await plant.person('planner', 'Twice Changed');
    const patch = (organisation: string) =>
      admin().patch(`/api/users/${person.id}`).set('If-Match', '"1"').send({ organisation });
    expect((await patch('First')).status).toBe(200);
    const second = await patch('Second');
    expect(second.status).toBe(412);
    expect(second.body.current).toMatchObject({ organisation: 'First', version: 2 });
    const blind = await admin().patch(`/api/users/${person.id}`).send({ organisation: 'x' });
    expect(blind.status).toBe(428);
  });

  it('ends all sessions of a person on request, and says so in the history', async () => {
    const person = await plant.person('inspector', 'Lost Telephone');
    const ended = await admin().post(`/api/users/${person.id}/sessions/end`).send({});
    expect(ended.body).toEqual({ ended: 1 });
    expect((await as(plant.app, person).get('/api/session')).status).toBe(401);
    expect(await lastEntry()).toMatchObject({
      action: 'person.sessions-ended',
      entityId: person.id,
    });
  });

  it('walks pages without losing or repeating anybody, in both orders', async () => {
    for (const sort of ['name', '-role', 'certificateValidUntil']) {
      const seen: string[] = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const answer = await admin()
          .get('/api/users')
          .query({
            sort,
            limit: 3,
            ...(cursor ? { cursor } : {}),
          });
        seen.push(...(answer.body.rows as { id: string }[]).map((row) => row.id));
        cursor = answer.body.nextCursor as string | null;
      }
      const all = await plant.db.select({ id: people.id }).from(people);
      expect(seen).toHaveLength(all.length);
      expect(new Set(seen).size).toBe(all.length);
    }
  });

  it('finds people by words, taking wildcards literally', async () => {
    const found = await admin().get('/api/users').query({ search: 'test author' });
    expect(found.body.rows.map((row: { name: string }) => row.name)).toEqual(['Test author']);
    expect((await admin().get('/api/users').query({ search: '%' })).body.rows).toEqual([]);
  });

  it('knows nobody of another site', async () => {
    const elsewhere = await addSite(plant.db, 'ELSE', 'Elsewhere Works');
    const stranger = await plant.person('administrator', 'A Stranger', elsewhere);
    expect((await admin().get(`/api/users/${stranger.id}`)).status).toBe(404);
    expect((await admin().post(`/api/users/${stranger.id}/sessions/end`).send({})).status).toBe(
      404,
    );
    const patched = await admin()
      .patch(`/api/users/${stranger.id}`)
      .set('If-Match', '"1"')
      .send({ name: 'Taken Over' });
    expect(patched.status).toBe(404);
    const listed = await admin().get('/api/users').query({ search: 'stranger' });
    expect(listed.body.rows).toEqual([]);
  });
});
