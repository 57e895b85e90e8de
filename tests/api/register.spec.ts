import { addSite, as, testPlant, type TestPlant } from '../support/test-plant';

let plant: TestPlant;

beforeAll(async () => {
  plant = await testPlant();
});
afterAll(() => plant.close());

const MATERIAL = {
  name: 'P355GH plate',
  specification: 'EN 10028-2 P355GH',
  heatNo: 'B1',
  yieldMpa: 285,
  tensileMpa: 460,
  youngsModulusMpa: 207_000,
  poissonsRatio: 0.3,
  toughnessMpaSqrtM: 60,
  toughnessTemperatureC: 20,
  yieldPlateau: false,
  origins: Object.fromEntries(
    ['yieldMpa', 'tensileMpa', 'youngsModulusMpa', 'poissonsRatio', 'toughnessMpaSqrtM'].map(
      (name) => [name, { provenance: 'certificate', note: 'Certificate B1' }],
    ),
  ),
};

async function makeParts() {
  const engineer = as(plant.app, plant.engineer);
  const unit = await engineer
    .post('/api/units')
    .send({ code: `U${Math.floor(Math.random() * 1e6)}`, name: 'Batch' });
  const material = await engineer
    .post('/api/materials')
    .send({ ...MATERIAL, name: `Plate ${Math.random()}` });
  expect([unit.status, material.status]).toEqual([201, 201]);
  return { unitId: unit.body.id as string, materialId: material.body.id as string };
}

const component = (parts: { unitId: string; materialId: string }, tag: string) => ({
  ...parts,
  tag,
  description: 'Batch reactor',
  kind: 'vessel shell',
  insideDiameterMm: 2600,
  wallMm: 28,
  requiredWallMm: 24.8,
  designPressureMpa: 2.6,
  designTemperatureC: 160,
  operatingPressureMpa: 2.3,
  operatingTemperatureC: 145,
  minimumMetalTemperatureC: null,
  heatTreatment: 'post-weld heat treated',
  mechanism: 'fatigue',
  fluid: '',
  commissionedOn: '2006-04-24',
  drawingNo: 'D-1',
  state: 'in service',
});

describe('the register', () => {
  it('keeps a component with its parts and tells its history', async () => {
    const engineer = as(plant.app, plant.engineer);
    const added = await engineer
      .post('/api/components')
      .send(component(await makeParts(), 'R-401'));
    expect(added.status).toBe(201);
    const id = added.body.id as string;
    const place = await engineer.post(`/api/components/${id}/locations`).send({
      name: 'L1',
      kind: 'longitudinal weld',
      description: '',
      datum: 'Stamp D1',
      clockZero: '',
      viewingDirection: '',
      circumferenceOn: 'outside',
      lengthMm: 6200,
      heatTreatment: null,
    });
    expect(place.status).toBe(201);
    const load = await engineer.post(`/api/components/${id}/load-cases`).send({
      name: 'Operating',
      kind: 'operating',
      pressureMpa: 2.3,
      temperatureC: 145,
      hoopMembraneMpa: 106.8,
      hoopBendingMpa: 90,
      axialMembraneMpa: 53.4,
      axialBendingMpa: 0,
      origins: Object.fromEntries(
        ['hoopMembraneMpa', 'hoopBendingMpa', 'axialMembraneMpa', 'axialBendingMpa'].map((name) => [
          name,
          { provenance: 'standard default', note: 'Thin wall' },
        ]),
      ),
    });
    expect(load.status).toBe(201);
    const cycle = await engineer.post(`/api/components/${id}/operating-cycles`).send({
      loadCaseId: load.body.id,
      name: 'Batch',
      rangeFraction: 1,
      countPerYear: 1400,
      source: 'Historian',
      periodFrom: null,
      periodTo: null,
    });
    expect(cycle.status).toBe(201);
    const read = await engineer.get(`/api/components/${id}`);
    expect(read.body).toMatchObject({
      tag: 'R-401',
      locations: [{ name: 'L1' }],
      loadCases: [{ hoopBendingMpa: 90 }],
      operatingCycles: [{ countPerYear: 1400 }],
    });
    const trail = await as(plant.app, plant.auditor).get(`/api/components/${id}/history`);
    expect(trail.body.rows.map((row: { action: string }) => row.action)).toEqual([
      'operating-cycle.added',
      'load-case.added',
      'location.added',
      'component.added',
    ]);
  });

  it('refuses a lost update and shows the current state', async () => {
    const engineer = as(plant.app, plant.engineer);
    const added = await engineer
      .post('/api/components')
      .send(component(await makeParts(), 'R-402'));
    const path = `/api/components/${added.body.id}`;
    const missing = await engineer.patch(path).send({ wallMm: 30, reason: 'Measured' });
    expect(missing.status).toBe(428);
    const first = await engineer
      .patch(path)
      .set('If-Match', '"1"')
      .send({ wallMm: 30, reason: 'Measured' });
    expect([first.status, first.headers['etag'], first.body.wallMm]).toEqual([200, '"2"', 30]);
    const second = await engineer
      .patch(path)
      .set('If-Match', '"1"')
      .send({ wallMm: 31, reason: 'Measured' });
    expect([second.status, second.body.current.wallMm]).toEqual([412, 30]);
  });

  it('says which field cannot be right', async () => {
    const engineer = as(plant.app, plant.engineer);
    const parts = await makeParts();
    const thick = await engineer
      .post('/api/components')
      .send({ ...component(parts, 'X-1'), wallMm: 400, insideDiameterMm: 700 });
    expect([thick.status, thick.body.errors[0].field]).toEqual([400, 'wallMm']);
    const unknown = await engineer
      .post('/api/components')
      .send({ ...component(parts, 'X-2'), version: 9 });
    expect([unknown.status, unknown.headers['content-type']]).toEqual([
      400,
      'application/problem+json; charset=utf-8',
    ]);
    await engineer.post('/api/components').send(component(parts, 'X-3'));
    const twice = await engineer.post('/api/components').send(component(parts, 'X-3'));
    expect([twice.status, twice.body.errors[0].field]).toEqual([409, 'tag']);
    const weak = await engineer
      .post('/api/materials')
      .send({ ...MATERIAL, name: 'Weak', tensileMpa: 200 });
    expect([weak.status, weak.body.errors[0].field]).toEqual([400, 'tensileMpa']);
  });

  it('lists by words, filter and sort, page by page', async () => {
    const engineer = as(plant.app, plant.engineer);
    const parts = await makeParts();
    for (const tag of ['P-1', 'P-2', 'P-3', 'P-4', 'P-5']) {
      await engineer.post('/api/components').send(component(parts, tag));
    }
    const tags: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const answer = await engineer.get(
        `/api/components?unit=${parts.unitId}&sort=-tag&limit=2&cursor=${cursor}`,
      );
      expect(answer.status).toBe(200);
      tags.push(...answer.body.rows.map((row: { tag: string }) => row.tag));
      cursor = answer.body.nextCursor as string | null;
    }
    expect(tags).toEqual(['P-5', 'P-4', 'P-3', 'P-2', 'P-1']);
    const due = await engineer.get(`/api/components?unit=${parts.unitId}&sort=due&search=P-3`);
    expect(due.body.rows).toMatchObject([
      { tag: 'P-3', flaws: 0, worstVerdict: null, nextDueOn: null },
    ]);
    const found = await engineer.get('/api/search?q=P-3');
    expect(found.body.items).toMatchObject([{ kind: 'component', title: 'P-3' }]);
    const literal = await engineer.get('/api/search?q=%25%25');
    expect(literal.body.items).toEqual([]);
  });

  it('shows nothing of another site', async () => {
    const other = await addSite(plant.db, `O${Date.now()}`, 'Other works');
    const stranger = as(plant.app, await plant.person('engineer', 'Stranger', other));
    const added = await as(plant.app, plant.engineer)
      .post('/api/components')
      .send(component(await makeParts(), 'S-1'));
    const id = added.body.id as string;
    expect((await stranger.get(`/api/components/${id}`)).status).toBe(404);
    expect(
      (
        await stranger
          .patch(`/api/components/${id}`)
          .set('If-Match', '"1"')
          .send({ wallMm: 2, reason: 'none' })
      ).status,
    ).toBe(404);
    expect((await stranger.get('/api/components')).body.rows).toEqual([]);
    expect((await stranger.get('/api/search?q=S-1')).body.items).toEqual([]);
    const foreign = await stranger
      .post('/api/components')
      .send(component({ unitId: added.body.unitId, materialId: added.body.materialId }, 'S-2'));
    expect(foreign.status).toBe(422);
  });

  it('adds a table of components as a whole, and tells what is wrong by row and column', async () => {
    const engineer = as(plant.app, plant.engineer);
    const { unitId, materialId } = await makeParts();
    const units = await engineer.get('/api/units');
    const unit = units.body.rows.find((each: { id: string }) => each.id === unitId).code as string;
    const material = (await engineer.get(`/api/materials/${materialId}`)).body.name as string;
    const header =
      'tag,description,unit,kind,inside_diameter_mm,wall_mm,design_pressure_mpa,design_temperature_c,operating_pressure_mpa,operating_temperature_c,material,heat_treatment,mechanism,commissioned_on';
    const row = (tag: string, wall = '20', kind = 'vessel shell') =>
      `${tag},Drum,${unit},${kind},1800,${wall},1.4,110,1.2,95,${material},as-welded,fatigue,2006-04-24`;
    const send = (lines: string[]) =>
      engineer
        .post('/api/register-imports')
        .attach('file', Buffer.from([header, ...lines].join('\n')), 'register.csv');
    const bad = await send([row('T-1'), row('T-2', 'thick'), row('T-3', '20', 'tank'), row('T-1')]);
    expect(bad.body.rows.map((each: { state: string }) => each.state)).toEqual([
      'new',
      'cannot be taken',
      'cannot be taken',
      'cannot be taken',
    ]);
    expect(bad.body.rows[1].problems[0]).toMatchObject({
      row: 3,
      column: 'wall_mm',
      original: 'thick',
    });
    expect(bad.body.rows[2].problems[0].message).toMatch(
      /^“tank” is not one of the words known here\. Use one of: vessel shell/,
    );
    const gaps = await send(['', row('T-8'), '', row('T-9', 'thick'), row('t-8')]);
    expect(
      gaps.body.rows.map((each: { row: number; state: string }) => [each.row, each.state]),
    ).toEqual([
      [3, 'new'],
      [5, 'cannot be taken'],
      [6, 'cannot be taken'],
    ]);
    const refused = await engineer
      .post('/api/register-imports/commit')
      .send({ fileName: 'register.csv', csv: bad.body.csv });
    expect(refused.status).toBe(422);
    expect((await engineer.get('/api/components?search=T-1')).body.rows).toEqual([]);
    const good = await send([row('T-1'), row('T-2')]);
    const added = await engineer
      .post('/api/register-imports/commit')
      .send({ fileName: 'register.csv', csv: good.body.csv });
    expect([added.status, added.body.added]).toEqual([201, ['T-1', 'T-2']]);
    const again = await send([row('t-1'), row('T-4')]);
    expect(again.body.rows.map((each: { state: string }) => each.state)).toEqual([
      'already in the register',
      'new',
    ]);
  });

  it('keeps one record of a vessel, however its tag is spelled', async () => {
    const parts = await makeParts();
    const engineer = as(plant.app, plant.engineer);
    expect((await engineer.post('/api/components').send(component(parts, 'QQ-1'))).status).toBe(
      201,
    );
    const again = await engineer.post('/api/components').send(component(parts, 'qq-1'));
    expect([again.status, again.body.errors[0].field]).toEqual([409, 'tag']);
  });

  it('takes the two pieces of a growth law in their order only', async () => {
    const engineer = as(plant.app, plant.engineer);
    const steep = { coefficient: 4.37e-26, exponent: 8.16 };
    const flat = { coefficient: 1.29e-12, exponent: 2.88 };
    const law = (key: string, stages: object[]) => ({
      ...{ key, title: 'Invented', environment: 'air', thresholdMpaSqrtMm: 63, source: 'Test' },
      stages,
    });
    const swapped = await engineer.post('/api/growth-laws').send(law('swapped', [flat, steep]));
    expect([swapped.status, swapped.body.errors[0].message]).toEqual([
      400,
      expect.stringContaining('has to be the steeper one'),
    ]);
    const right = await engineer.post('/api/growth-laws').send(law('right', [steep, flat]));
    expect(right.status).toBe(201);
  });

  it('lets only engineers and administrators write', async () => {
    const parts = await makeParts();
    for (const person of [plant.inspector, plant.planner, plant.operations, plant.auditor]) {
      expect(
        (await as(plant.app, person).post('/api/components').send(component(parts, 'Z-1'))).status,
      ).toBe(403);
      expect((await as(plant.app, person).get('/api/components')).status).toBe(200);
    }
    expect((await as(plant.app, null).get('/api/components')).status).toBe(401);
  });
});
