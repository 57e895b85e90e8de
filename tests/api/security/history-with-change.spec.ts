import { history } from '@ligament/domain/schema/history';
import { outgoingMails } from '@ligament/domain/schema/schedule';
import { oneTimeTokens, people } from '@ligament/domain/schema/people';
import { siteRuleVersions } from '@ligament/domain/schema/sites';
import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { sql } from 'drizzle-orm';
import { as, testPlant, type TestPlant } from '../../support/test-plant';

describe('a change and its history entry', () => {
  let plant: TestPlant;
  beforeAll(async () => {
    plant = await testPlant();
  }, 60_000);
  afterAll(() => plant.close());

  const counts = async () => ({
    people: (await plant.db.select().from(people)).length,
    rules: (await plant.db.select().from(siteRuleVersions)).length,
    mails: (await plant.db.select().from(outgoingMails)).length,
    tokens: (await plant.db.select().from(oneTimeTokens)).length,
    history: (await plant.db.select().from(history)).length,
  });
  const asOwner = async (statement: ReturnType<typeof sql>) => {
    await plant.db.execute(sql`reset role`);
    await plant.db.execute(statement);
    await plant.db.execute(sql`set role ligament_app`);
  };
  const admin = () => as(plant.app, plant.administrator);
  const writes = () => [
    admin().post('/api/users').send({ name: 'New', email: 'new@example.org', role: 'planner' }),
    admin()
      .patch(`/api/users/${plant.planner.id}`)
      .set('If-Match', '"1"')
      .send({ organisation: 'Brackwater Process Ltd' }),
    admin()
      .post('/api/site-rules')
      .set('If-Match', '"1"')
      .send({
        rules: { ...DEFAULT_SITE_RULES, lifeFraction: 0.4 },
        effectiveOn: '2026-12-01',
        reason: 'Revision 7',
      }),
  ];

  it('are both lost when the entry cannot be written', async () => {
    const before = await counts();
    await asOwner(sql`alter table history add constraint nothing_more check (false) not valid`);
    for (const write of writes()) expect((await write).status).toBe(500);
    await asOwner(sql`alter table history drop constraint nothing_more`);
    expect(await counts()).toEqual(before);
    const { body } = await admin().get(`/api/users/${plant.planner.id}`);
    expect(body).toMatchObject({ organisation: '', version: 1 });
  });

  it('are both kept otherwise: one entry each, by whom, when and of what', async () => {
    const before = await counts();
    for (const write of writes()) expect((await write).status).toBeLessThan(300);
    expect((await counts()).history).toBe(before.history + 3);
    for (const entry of (await plant.db.select().from(history)).slice(-3)) {
      expect(entry).toMatchObject({
        at: plant.clock.now(),
        actorId: plant.administrator.id,
        actorRole: 'administrator',
        siteId: plant.siteId,
      });
      expect(entry.requestId).toMatch(/^[0-9a-f-]{36}$/);
    }
  });

  it('are not written for a change that changes nothing', async () => {
    const before = await counts();
    const answer = await admin()
      .patch(`/api/users/${plant.planner.id}`)
      .set('If-Match', '"2"')
      .send({ organisation: 'Brackwater Process Ltd' });
    expect(answer.status).toBe(200);
    expect((await counts()).history).toBe(before.history);
  });
});
