import { findings, flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { eq } from 'drizzle-orm';
import { addFinding, addReactor } from '../support/plant-records';
import { addSite, as, testPlant, type TestPerson, type TestPlant } from '../support/test-plant';

let plant: TestPlant;
let reactor: Awaited<ReturnType<typeof addReactor>>;

beforeAll(async () => {
  plant = await testPlant();
  reactor = await addReactor(plant.db, plant.siteId, 'R-401');
});
afterAll(() => plant.close());

const etag = (version: number) => `"${version}"`;
const engineer = () => as(plant.app, plant.engineer);
const flawWith = (heightMm: number, lengthMm = 40, on = '2026-11-10') =>
  addFinding(plant.db, reactor, { on, heightMm, lengthMm });

interface Row {
  readonly id: string;
  readonly number: string;
  readonly heightMm: number | null;
}
const rowsOf = (body: { rows: Row[] }) => body.rows;

async function start(flawId: string, body: object = {}) {
  const started = await engineer().post(`/api/flaws/${flawId}/assessments`).send(body);
  expect(started.status).toBe(201);
  return started.body as { id: string; version: number };
}

async function submitted(flawId: string, editor: TestPerson = plant.engineer) {
  const { id, version } = await start(flawId);
  const path = `/api/assessments/${id}`;
  const changed = await as(plant.app, editor)
    .patch(path)
    .set('If-Match', etag(version))
    .send({ conclusion: 'Acceptable until inspected again.' });
  const sent = await engineer().post(`${path}/submit`).set('If-Match', etag(changed.body.version));
  expect(sent.status).toBe(200);
  return { path, version: sent.body.version as number };
}

const approve = ({ path, version }: { path: string; version: number }, person: TestPerson) =>
  as(plant.app, person)
    .post(`${path}/approve`)
    .set('If-Match', etag(version))
    .send({ comment: '' });

describe('the list of flaws', () => {
  it('goes through every flaw once, page by page, in the order asked for', async () => {
    for (const height of [3, 8, 5, 6]) await flawWith(height);
    const all = rowsOf((await engineer().get('/api/flaws?sort=-height&limit=200')).body);
    const heights = all.map(({ heightMm }) => heightMm ?? 0);
    expect(heights).toEqual([...heights].sort((a, b) => b - a));
    const seen: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const more: string = cursor ? `&cursor=${encodeURIComponent(cursor)}` : '';
      const page = await engineer().get(`/api/flaws?sort=-height&limit=3${more}`);
      expect(page.status).toBe(200);
      seen.push(...rowsOf(page.body).map(({ id }) => id));
      cursor = page.body.nextCursor as string | null;
    }
    expect(seen).toEqual(all.map(({ id }) => id));
  });

  it('finds by words, component, state and verdict, and refuses a word no list knows', async () => {
    const { flawId } = await flawWith(4);
    const number = (await engineer().get(`/api/flaws/${flawId}`)).body.number as string;
    const found = await engineer().get(`/api/flaws?search=${number}`);
    expect(rowsOf(found.body).map(({ id }) => id)).toEqual([flawId]);
    const other = await addReactor(plant.db, plant.siteId);
    const none = await engineer().get(`/api/flaws?component=${other.component.id}`);
    expect(none.body.rows).toEqual([]);
    expect((await engineer().get('/api/flaws?state=new&limit=1')).body.rows).toHaveLength(1);
    expect((await engineer().get('/api/flaws?verdict=fine')).status).toBe(400);
    expect((await engineer().get('/api/flaws?cursor=nonsense')).status).toBe(400);
  });

  it('takes the size of the newest finding whose inspection counts', async () => {
    const { flawId } = await flawWith(4);
    const later = await addFinding(plant.db, reactor, {
      on: '2026-11-20',
      heightMm: 9,
      lengthMm: 50,
      flawId,
    });
    const size = async () => {
      const { body } = await engineer().get('/api/flaws?limit=200');
      return rowsOf(body).find(({ id }) => id === flawId)?.heightMm;
    };
    expect(await size()).toBe(9);
    await plant.db
      .update(inspections)
      .set({ state: 'rejected' })
      .where(eq(inspections.id, later.inspection.id));
    expect(await size()).toBe(4);
  });
});

describe('one flaw', () => {
  it('shows findings with their sizing errors and its assessments', async () => {
    const { flawId } = await flawWith(5);
    await submitted(flawId);
    const { body, headers } = await as(plant.app, plant.planner).get(`/api/flaws/${flawId}`);
    expect(headers['etag']).toBe(etag(body.version));
    expect(body).toMatchObject({
      tag: 'R-401',
      findings: [{ heightMm: 5, heightErrorMm: 0.7, lengthErrorMm: 3 }],
      assessments: [{ revision: 1, state: 'submitted', authorName: 'Test author' }],
      reinspection: null,
    });
  });

  it('is changed with a reason, at the version seen, by engineers only', async () => {
    const { flawId } = await flawWith(5);
    const path = `/api/flaws/${flawId}`;
    const { version } = (await engineer().get(path)).body;
    const body = { mechanism: 'corrosion fatigue', reason: 'Beach marks with deposits' };
    for (const person of [plant.inspector, plant.planner, plant.auditor, plant.administrator]) {
      const refused = await as(plant.app, person)
        .patch(path)
        .set('If-Match', etag(version))
        .send(body);
      expect(refused.status).toBe(403);
    }
    const bare = await engineer()
      .patch(path)
      .set('If-Match', etag(version))
      .send({ mechanism: 'fatigue' });
    expect([bare.status, bare.body.errors[0].field]).toEqual([400, 'reason']);
    const changed = await engineer().patch(path).set('If-Match', etag(version)).send(body);
    expect([changed.status, changed.body.mechanism]).toEqual([200, 'corrosion fatigue']);
    const stale = await engineer().patch(path).set('If-Match', etag(version)).send(body);
    expect([stale.status, stale.body.current.version]).toEqual([412, version + 1]);
    const trail = await engineer().get(`/api/history?flaw=${flawId}`);
    expect(trail.body.rows[0]).toMatchObject({
      action: 'flaw.changed',
      reason: 'Beach marks with deposits',
    });
  });

  it('is not closed while a re-inspection of it is open', async () => {
    const { flawId } = await flawWith(5);
    expect((await approve(await submitted(flawId), plant.reviewer)).status).toBe(200);
    const { version } = (await engineer().get(`/api/flaws/${flawId}`)).body;
    const closed = await engineer()
      .patch(`/api/flaws/${flawId}`)
      .set('If-Match', etag(version))
      .send({ state: 'closed', reason: 'Shown to be geometry' });
    expect([closed.status, closed.body.errors[0].field]).toEqual([422, 'state']);
  });

  it('of another site, and its assessments, are not there', async () => {
    const { flawId } = await flawWith(5);
    const { id } = await start(flawId);
    const otherSite = await addSite(plant.db, 'ELSE', 'Another works');
    const stranger = as(plant.app, await plant.person('engineer', 'Test stranger', otherSite));
    const reads = [
      `/api/flaws/${flawId}`,
      `/api/flaws/${flawId}/assessments`,
      `/api/flaws/${flawId}/assessment-inputs`,
      `/api/assessments/${id}`,
      `/api/assessments/${id}/recompute`,
    ];
    for (const path of reads)
      expect([path, (await stranger.get(path)).status]).toEqual([path, 404]);
    const writes = [
      stranger.post(`/api/flaws/${flawId}/assessments`).send({}),
      stranger.patch(`/api/assessments/${id}`).set('If-Match', etag(1)).send({ conclusion: 'x' }),
      stranger.post(`/api/assessments/${id}/submit`).set('If-Match', etag(1)),
      stranger
        .post(`/api/assessments/${id}/approve`)
        .set('If-Match', etag(1))
        .send({ comment: '' }),
    ];
    for (const write of writes) expect((await write).status).toBe(404);
    expect((await stranger.get('/api/flaws')).body.rows).toEqual([]);
  });
});

describe('an assessment between several people', () => {
  it('is not approved by anybody who changed it, though another wrote it', async () => {
    const { flawId } = await flawWith(5);
    const third = await plant.person('engineer', 'Test third');
    const sent = await submitted(flawId, plant.reviewer);
    expect((await approve(sent, plant.reviewer)).status).toBe(403);
    expect((await approve(sent, third)).status).toBe(200);
  });

  it('is not overwritten by who saw an older version', async () => {
    const { flawId } = await flawWith(5);
    const { id, version } = await start(flawId);
    const path = `/api/assessments/${id}`;
    const first = await engineer()
      .patch(path)
      .set('If-Match', etag(version))
      .send({ conclusion: 'First.' });
    expect(first.headers['etag']).toBe(etag(version + 1));
    const late = await as(plant.app, plant.reviewer)
      .patch(path)
      .set('If-Match', etag(version))
      .send({ conclusion: 'Second.' });
    expect([late.status, late.body.current.conclusion]).toEqual([412, 'First.']);
    expect((await engineer().get(path)).body.conclusion).toBe('First.');
    expect((await engineer().patch(path).send({ conclusion: 'No version.' })).status).toBe(428);
  });

  it('is one at a time for a flaw', async () => {
    const { flawId } = await flawWith(5);
    await start(flawId);
    const second = await engineer().post(`/api/flaws/${flawId}/assessments`).send({});
    expect([second.status, second.body.type]).toEqual([
      409,
      'urn:ligament:problem:assessment.open',
    ]);
  });
});

describe('the inputs an assessment starts with', () => {
  it('take a ligament nobody recorded as none, and say that it is assumed', async () => {
    const { flawId, finding } = await flawWith(4);
    await plant.db.update(findings).set({ kind: 'embedded' }).where(eq(findings.id, finding.id));
    await plant.db.update(flaws).set({ kind: 'embedded' }).where(eq(flaws.id, flawId));
    const { body } = await engineer().get(`/api/flaws/${flawId}/assessment-inputs`);
    expect(body.input.flaw.ligamentMm).toMatchObject({ value: 0, provenance: 'assumed' });
  });

  it('are of the finding that was asked for', async () => {
    const { flawId, finding } = await flawWith(4, 40, '2024-05-02');
    await addFinding(plant.db, reactor, { on: '2026-11-10', heightMm: 6, lengthMm: 44, flawId });
    const of = async (query: string) =>
      (await engineer().get(`/api/flaws/${flawId}/assessment-inputs${query}`)).body;
    expect((await of('')).inspectedOn).toBe('2026-11-10');
    const old = await of(`?findingId=${finding.id}`);
    expect([old.inspectedOn, old.input.flaw.heightMm.value]).toEqual(['2024-05-02', 4]);
  });
});
