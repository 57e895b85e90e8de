import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { history } from '@ligament/domain/schema/history';
import { desc } from 'drizzle-orm';
import { currentSiteRules } from '../../apps/api/src/modules/site-rules/current-site-rules';
import { addSite, as, testPlant, type TestPlant } from '../support/test-plant';

describe('site rules', () => {
  let plant: TestPlant;
  const admin = () => as(plant.app, plant.administrator);
  beforeAll(async () => {
    plant = await testPlant();
  }, 60_000);
  afterAll(() => plant.close());

  const record = (seen: number, change: Record<string, unknown> = {}) =>
    admin()
      .post('/api/site-rules')
      .set('If-Match', `"${seen}"`)
      .send({
        rules: { ...DEFAULT_SITE_RULES, lifeFraction: 0.4 },
        effectiveOn: '2026-12-01',
        reason: 'Procedure revision 7',
        ...change,
      });

  it('records a new version, keeps the earlier one and says in the history what changed', async () => {
    const answer = await record(1);
    expect(answer.status).toBe(201);
    expect(answer.body).toMatchObject({ number: 2, createdBy: 'Test administrator' });
    const { body } = await admin().get('/api/site-rules');
    expect(body.current.number).toBe(2);
    expect(body.versions.map((each: { number: number }) => each.number)).toEqual([2, 1]);
    const [entry] = await plant.db.select().from(history).orderBy(desc(history.seq)).limit(1);
    expect(entry).toMatchObject({
      action: 'site-rules.recorded',
      reason: 'Procedure revision 7',
      before: { number: 1, lifeFraction: 0.5, effectiveOn: '2020-01-01' },
      after: { number: 2, lifeFraction: 0.4, effectiveOn: '2026-12-01' },
    });
    const current = await currentSiteRules(plant.db, plant.siteId);
    expect(current).toMatchObject({ number: 2, rules: { lifeFraction: 0.4 } });
  });

  it('refuses a version made without having seen the one in force', async () => {
    const stale = await record(1, { rules: { ...DEFAULT_SITE_RULES, lifeFraction: 0.3 } });
    expect(stale.status).toBe(412);
    expect(stale.body.current.number).toBe(2);
  });

  it('refuses rules that change nothing, lie in the future or list leads out of order', async () => {
    const rules = { ...DEFAULT_SITE_RULES, lifeFraction: 0.4 };
    expect((await record(2, { rules })).status).toBe(409);
    const other = { ...rules, lifeFraction: 0.35 };
    const future = await record(2, { rules: other, effectiveOn: '2026-12-02' });
    expect(future.status).toBe(422);
    expect(future.body.errors[0].field).toBe('effectiveOn');
    const leads = await record(2, { rules: { ...other, reminderLeadDays: [30, 90] } });
    expect(leads.status).toBe(422);
  });

  it('names the value that is out of bounds', async () => {
    const answer = await record(2, { rules: { ...DEFAULT_SITE_RULES, lifeFraction: 1.2 } });
    expect(answer.status).toBe(400);
    expect(answer.body.errors[0].field).toBe('rules.lifeFraction');
  });

  it('is written by administrators only and read on one’s own site only', async () => {
    const refused = await as(plant.app, plant.engineer)
      .post('/api/site-rules')
      .set('If-Match', '"2"')
      .send({ rules: DEFAULT_SITE_RULES, effectiveOn: '2026-12-01', reason: 'No' });
    expect(refused.status).toBe(403);
    const elsewhere = await addSite(plant.db, 'ELSE', 'Elsewhere Works');
    const stranger = await plant.person('auditor', 'A Stranger', elsewhere);
    const { body } = await as(plant.app, stranger).get('/api/site-rules');
    expect(body.versions).toHaveLength(1);
    expect(body.current.number).toBe(1);
  });
});
