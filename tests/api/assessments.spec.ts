import { assessments, signatures } from '@ligament/domain/schema/assessments';
import { reinspections } from '@ligament/domain/schema/schedule';
import { eq, sql } from 'drizzle-orm';
import { addFinding, addReactor } from '../support/plant-records';
import { as, testPlant, type TestPerson, type TestPlant } from '../support/test-plant';

let plant: TestPlant;

beforeAll(async () => {
  plant = await testPlant();
});
afterAll(() => plant.close());

const etag = (version: number) => `"${version}"`;

async function flawOf(
  size: { heightMm: number; lengthMm: number } = { heightMm: 7.6, lengthMm: 74 },
) {
  const reactor = await addReactor(plant.db, plant.siteId);
  const found = await addFinding(plant.db, reactor, { on: '2026-11-10', ...size });
  return { reactor, ...found };
}

const author = () => as(plant.app, plant.engineer);
const reviewer = () => as(plant.app, plant.reviewer);

async function draftOf(flawId: string) {
  const started = await author().post(`/api/flaws/${flawId}/assessments`).send({});
  expect(started.status).toBe(201);
  return started.body as {
    id: string;
    version: number;
    chosenDueOn: string;
    proposal: { limitOn: string; dueOn: string };
  };
}

async function submitted(flawId: string, more: object = {}) {
  const draft = await draftOf(flawId);
  const path = `/api/assessments/${draft.id}`;
  const changed = await author()
    .patch(path)
    .set('If-Match', etag(draft.version))
    .send({ conclusion: 'Acceptable until re-inspected.', ...more });
  expect(changed.status).toBe(200);
  const sent = await author().post(`${path}/submit`).set('If-Match', etag(changed.body.version));
  expect(sent.status).toBe(200);
  return { path, id: draft.id, version: sent.body.version as number, body: sent.body };
}

async function approve(path: string, version: number, person: TestPerson = plant.reviewer) {
  return as(plant.app, person)
    .post(`${path}/approve`)
    .set('If-Match', etag(version))
    .send({ comment: 'Checked' });
}

describe('an assessment', () => {
  it('starts with every input from register, finding and site lists', async () => {
    const { flawId } = await flawOf();
    const draft = await author().post(`/api/flaws/${flawId}/assessments`).send({});
    expect(draft.body.input).toMatchObject({
      wall: { shape: 'cylinder', thicknessMm: { value: 28, provenance: 'certificate' } },
      flaw: { heightMm: { value: 7.6, provenance: 'measured' } },
      sizing: { heightAllowanceMm: { value: 1, provenance: 'standard default' } },
      stress: {
        primaryBendingMPa: { value: 90, provenance: 'assumed' },
        residual: { state: 'heat-treated', flawToWeld: 'parallel' },
      },
      growth: { fatigue: { blocks: [{ membraneRangeMPa: 106.8, cyclesPerYear: 1400 }, {}] } },
    });
    expect(draft.body.outcome.status).toBe('assessed');
    expect(draft.body.outcome.reserveOnLoad).toBeGreaterThan(0.9);
    expect(draft.body.outcome.reserveOnLoad).toBeLessThan(1.2);
  });

  it('goes from draft over check and return to approval, and sets the date', async () => {
    const { flawId } = await flawOf({ heightMm: 5.2, lengthMm: 60 });
    const first = await submitted(flawId);
    const returned = await reviewer()
      .post(`${first.path}/return`)
      .set('If-Match', etag(first.version))
      .send({ reason: 'Show the bending stress basis' });
    expect([returned.status, returned.body.state]).toEqual([200, 'returned']);
    const changed = await author()
      .patch(first.path)
      .set('If-Match', etag(returned.body.version))
      .send({ conclusion: 'Acceptable until re-inspected; basis HC-401.' });
    const again = await author()
      .post(`${first.path}/submit`)
      .set('If-Match', etag(changed.body.version));
    const approved = await approve(first.path, again.body.version);
    expect([approved.status, approved.body.state]).toEqual([200, 'approved']);
    const [task] = await plant.db
      .select()
      .from(reinspections)
      .where(eq(reinspections.flawId, flawId));
    expect(task).toMatchObject({
      state: 'open',
      dueOn: approved.body.chosenDueOn,
      limitOn: approved.body.proposal.limitOn,
    });
    expect(task?.dueOn).toBe(approved.body.proposal.dueOn);
    const meanings = await plant.db
      .select({ meaning: signatures.meaning, hash: signatures.contentHash })
      .from(signatures)
      .where(eq(signatures.entityId, first.id))
      .orderBy(signatures.signedAt);
    expect(meanings.map(({ meaning }) => meaning)).toEqual([
      'authored',
      'returned',
      'authored',
      'reviewed and approved',
    ]);
    expect(meanings.at(-1)?.hash).toBe(approved.body.contentHash);
    const flaw = await author().get(`/api/flaws/${flawId}`);
    expect(flaw.body).toMatchObject({
      state: 'accepted with conditions',
      reinspection: { dueOn: task?.dueOn },
    });
    const trail = await as(plant.app, plant.auditor).get(`/api/history?flaw=${flawId}`);
    expect(trail.body.rows.map((row: { action: string }) => row.action)).toEqual(
      expect.arrayContaining([
        'assessment.approved',
        'assessment.returned',
        're-inspection.opened',
      ]),
    );
  });

  it('is never approved by anybody who worked on it, nor by another role', async () => {
    const { flawId } = await flawOf({ heightMm: 5, lengthMm: 50 });
    const { path, version } = await submitted(flawId);
    expect((await approve(path, version, plant.engineer)).status).toBe(403);
    for (const person of [
      plant.inspector,
      plant.planner,
      plant.operations,
      plant.auditor,
      plant.administrator,
    ]) {
      expect((await approve(path, version, person)).status).toBe(403);
    }
  });

  it('asks for the password again before approval', async () => {
    const { flawId } = await flawOf({ heightMm: 5, lengthMm: 50 });
    const { path, version } = await submitted(flawId);
    const before = plant.clock.now();
    plant.clock.set(new Date(before.getTime() + 6 * 60_000));
    const late = await approve(path, version);
    plant.clock.set(before);
    expect([late.status, late.body.type]).toEqual([403, 'urn:ligament:problem:proof-required']);
  });

  it('never changes once approved; a new one supersedes it', async () => {
    const { flawId, reactor } = await flawOf({ heightMm: 4.8, lengthMm: 50 });
    const first = await submitted(flawId);
    const approved = await approve(first.path, first.version);
    const edit = await author()
      .patch(first.path)
      .set('If-Match', etag(approved.body.version))
      .send({ conclusion: 'Other words' });
    expect(edit.status).toBe(409);
    await expect(
      plant.db.execute(sql`update assessments set conclusion = 'forged' where id = ${first.id}`),
    ).rejects.toThrow();
    await addFinding(plant.db, reactor, { on: '2026-11-28', heightMm: 5.4, lengthMm: 55, flawId });
    const second = await submitted(flawId);
    expect((await approve(second.path, second.version)).status).toBe(200);
    const states = await plant.db
      .select({ revision: assessments.revision, state: assessments.state })
      .from(assessments)
      .where(eq(assessments.flawId, flawId))
      .orderBy(assessments.revision);
    expect(states).toEqual([
      { revision: 1, state: 'superseded' },
      { revision: 2, state: 'approved' },
    ]);
    const tasks = await plant.db
      .select({ state: reinspections.state })
      .from(reinspections)
      .where(eq(reinspections.flawId, flawId));
    expect(tasks.map(({ state }) => state).sort()).toEqual(['cancelled', 'open']);
  });

  it('records the server’s own computation, whatever the browser sends', async () => {
    const { flawId } = await flawOf({ heightMm: 5, lengthMm: 50 });
    const draft = await draftOf(flawId);
    const forged = await author()
      .patch(`/api/assessments/${draft.id}`)
      .set('If-Match', etag(draft.version))
      .send({ outcome: { status: 'assessed', verdict: 'acceptable' } });
    expect(forged.status).toBe(400);
    const again = await as(plant.app, plant.auditor).get(`/api/assessments/${draft.id}/recompute`);
    expect(again.body).toMatchObject({ agrees: true, contentHashAgrees: true, differences: [] });
  });

  it('lets the date be earlier freely, later only with a reason, and never after the predicted limit', async () => {
    const { flawId } = await flawOf({ heightMm: 6.3, lengthMm: 66 });
    const draft = await draftOf(flawId);
    const path = `/api/assessments/${draft.id}`;
    const patch = (version: number, body: object) =>
      author().patch(path).set('If-Match', etag(version)).send(body);
    const earlier = await patch(draft.version, { chosenDueOn: '2026-12-20' });
    expect([earlier.status, earlier.body.chosenDueOn]).toEqual([200, '2026-12-20']);
    const dayAfter = (day: string, days: number) =>
      new Date(Date.parse(day) + days * 86_400_000).toISOString().slice(0, 10);
    const later = dayAfter(draft.proposal.dueOn, 10);
    const bare = await patch(earlier.body.version, { chosenDueOn: later });
    expect([bare.status, bare.body.errors[0].field]).toEqual([422, 'chosenReason']);
    const reasoned = await patch(earlier.body.version, {
      chosenDueOn: later,
      chosenReason: 'On-stream access agreed for that week',
    });
    expect(reasoned.status).toBe(200);
    const beyond = await patch(reasoned.body.version, {
      chosenDueOn: dayAfter(draft.proposal.limitOn, 1),
      chosenReason: 'Because',
    });
    expect([beyond.status, beyond.body.errors[0].field]).toEqual([422, 'chosenDueOn']);
  });

  it('gives an unacceptable flaw no date, and takes its re-inspection away', async () => {
    const { flawId } = await flawOf({ heightMm: 12, lengthMm: 130 });
    const { path, version, body } = await submitted(flawId);
    expect([body.outcome.verdict, body.chosenDueOn, body.proposal.status]).toEqual([
      'not acceptable',
      null,
      'no date',
    ]);
    expect((await approve(path, version)).status).toBe(200);
    const flaw = await author().get(`/api/flaws/${flawId}`);
    expect(flaw.body).toMatchObject({ state: 'not acceptable', reinspection: null });
  });

  it('refuses what cannot be signed: no conclusion, a refusal of the engine, an older finding, a report not accepted', async () => {
    const { flawId, reactor, inspection } = await flawOf({ heightMm: 5, lengthMm: 50 });
    const draft = await draftOf(flawId);
    const path = `/api/assessments/${draft.id}`;
    const submit = (version: number) =>
      author().post(`${path}/submit`).set('If-Match', etag(version));
    expect((await submit(draft.version)).body.errors[0].field).toBe('conclusion');
    const read = await author().get(path);
    const input = structuredClone(read.body.input);
    input.flaw.heightMm.value = 27.5;
    const deep = await author()
      .patch(path)
      .set('If-Match', etag(draft.version))
      .send({ input, conclusion: 'Words' });
    expect(deep.body.outcome.status).toBe('refused');
    expect((await submit(deep.body.version)).status).toBe(422);
    const good = await author()
      .patch(path)
      .set('If-Match', etag(deep.body.version))
      .send({ input: read.body.input });
    await plant.db.execute(
      sql`update inspections set state = 'submitted' where id = ${inspection.id}`,
    );
    expect((await submit(good.body.version)).body.type).toBe(
      'urn:ligament:problem:assessment.report-not-accepted',
    );
    await addFinding(plant.db, reactor, { on: '2026-11-29', heightMm: 5.4, lengthMm: 55, flawId });
    expect((await submit(good.body.version)).body.type).toBe(
      'urn:ligament:problem:assessment.older-finding',
    );
  });

  it('is refused for mechanisms outside its scope, with the way to go', async () => {
    const { flawId } = await flawOf();
    const read = await author().get(`/api/flaws/${flawId}`);
    const changed = await author()
      .patch(`/api/flaws/${flawId}`)
      .set('If-Match', etag(read.body.version))
      .send({ mechanism: 'hydrogen attack', reason: 'Specialist opinion' });
    expect(changed.body.scope).toContain('specialist');
    const started = await author().post(`/api/flaws/${flawId}/assessments`).send({});
    expect([started.status, started.body.type]).toEqual([
      422,
      'urn:ligament:problem:assessment.out-of-scope',
    ]);
  });

  it('previews without storing anything', async () => {
    const { flawId } = await flawOf({ heightMm: 5, lengthMm: 50 });
    const inputs = await as(plant.app, plant.inspector).get(
      `/api/flaws/${flawId}/assessment-inputs`,
    );
    const { input, inspectedOn, mechanism } = inputs.body;
    const preview = await as(plant.app, plant.inspector)
      .post('/api/assessments/preview')
      .send({ input, inspectedOn, mechanism });
    expect(preview.status).toBe(200);
    expect(preview.body.proposal.status).toBe('proposed');
    expect((await author().get(`/api/flaws/${flawId}/assessments`)).body.rows).toEqual([]);
  });

  it('lists flaws with their verdicts, most pressing first', async () => {
    const list = await author().get('/api/flaws?sort=verdict&limit=200');
    expect(list.status).toBe(200);
    const verdicts = list.body.rows.map((row: { verdict: string | null }) => row.verdict);
    expect(verdicts[0]).toBe('not acceptable');
    const bad = await author().get('/api/flaws?verdict=not%20acceptable');
    expect(bad.body.rows.length).toBeGreaterThan(0);
    expect(
      bad.body.rows.every((row: { verdict: string }) => row.verdict === 'not acceptable'),
    ).toBe(true);
  });
});
