import { randomUUID } from 'node:crypto';
import { components } from '@ligament/domain/schema/components';
import { materials } from '@ligament/domain/schema/materials';
import { units } from '@ligament/domain/schema/sites';
import { writeHistory, type HistoryEntry } from '../../apps/api/src/modules/history/write-history';
import { addSite, as, testPlant, type TestPerson, type TestPlant } from '../support/test-plant';

describe('history', () => {
  let plant: TestPlant;
  let vessel: string;
  const auditor = () => as(plant.app, plant.auditor);

  const record = async (person: TestPerson, at: string, entry: Partial<HistoryEntry>) => {
    const actor = {
      siteId: plant.siteId,
      personId: person.id,
      name: person.name,
      role: person.role,
      requestId: '',
    };
    await plant.db.transaction((tx) =>
      writeHistory(tx, actor, new Date(at), {
        action: 'component.changed',
        entity: 'component',
        entityId: vessel,
        summary: 'Changed R-401',
        ...entry,
      }),
    );
  };

  beforeAll(async () => {
    plant = await testPlant();
    vessel = await addVessel(plant);
    await record(plant.engineer, '2026-11-30T23:30:00.123Z', { summary: 'Late entry on the 30th' });
    await record(plant.engineer, '2026-12-01T00:00:00.000Z', {
      summary: 'First entry of December',
      reason: 'Wall measured again, 34.2 mm',
      before: { wallMm: 35 },
      after: { wallMm: 34.2 },
    });
    const inspection = randomUUID();
    await record(plant.inspector, '2026-12-01T08:00:00.000Z', {
      action: 'inspection.submitted',
      entity: 'inspection',
      entityId: inspection,
      componentId: vessel,
      summary: 'Submitted report NIS-1',
    });
    await record(plant.planner, '2026-12-01T09:00:00.000Z', {
      action: 'shutdown-window.planned',
      entity: 'shutdown window',
      entityId: randomUUID(),
      summary: '=HYPERLINK("http://example.org"), planned "T1"',
    });
  }, 60_000);
  afterAll(() => plant.close());

  const summaries = async (path: string, query: Record<string, string> = {}) => {
    const answer = await auditor().get(path).query(query);
    expect(answer.status).toBe(200);
    return (answer.body.rows as { summary: string }[]).map((row) => row.summary);
  };

  it('tells everything newest first, with who, when, before, after and why', async () => {
    const { body } = await auditor().get('/api/history');
    expect(body.rows).toHaveLength(4);
    expect(body.rows[2]).toMatchObject({
      at: '2026-12-01T00:00:00.000Z',
      actor: { id: plant.engineer.id, name: 'Test author', role: 'engineer' },
      before: { wallMm: 35 },
      after: { wallMm: 34.2 },
      reason: 'Wall measured again, 34.2 mm',
    });
  });

  it('shows the whole life of a component with what belongs to it, and nothing else', async () => {
    expect(await summaries(`/api/components/${vessel}/history`)).toEqual([
      'Submitted report NIS-1',
      'First entry of December',
      'Late entry on the 30th',
    ]);
  });

  it('filters by record, person, words and days of the site', async () => {
    expect(await summaries('/api/history', { entity: 'inspection' })).toHaveLength(1);
    expect(await summaries('/api/history', { actor: plant.engineer.id })).toHaveLength(2);
    expect(await summaries('/api/history', { actor: 'system' })).toEqual([]);
    expect(await summaries('/api/history', { search: '34.2' })).toEqual([
      'First entry of December',
    ]);
    expect(await summaries('/api/history', { search: 'R-401' })).toEqual([
      'Submitted report NIS-1',
    ]);
    expect(await summaries('/api/history', { to: '2026-11-30' })).toEqual([
      'Late entry on the 30th',
    ]);
    expect(await summaries('/api/history', { from: '2026-12-01', to: '2026-12-01' })).toHaveLength(
      3,
    );
    expect(await summaries('/api/history', { component: vessel })).toHaveLength(3);
  });

  it('lists who stands in it', async () => {
    const { body } = await auditor().get('/api/history/actors');
    expect(body.rows.map((row: { name: string }) => row.name)).toEqual([
      'Test author',
      'Test inspector',
      'Test planner',
    ]);
  });

  it('pages without losing or repeating an entry, and refuses a made-up place', async () => {
    const first = await auditor().get('/api/history').query({ limit: 3 });
    const rest = await auditor()
      .get('/api/history')
      .query({ limit: 3, cursor: first.body.nextCursor });
    const all = [...first.body.rows, ...rest.body.rows].map((row: { seq: number }) => row.seq);
    expect(all).toEqual([...all].sort((a, b) => b - a));
    expect(new Set(all).size).toBe(4);
    expect(rest.body.nextCursor).toBeNull();
    expect((await auditor().get('/api/history').query({ cursor: 'abc' })).status).toBe(400);
  });

  it('exports what is filtered as CSV that no spreadsheet runs', async () => {
    const answer = await auditor().get('/api/history.csv').query({ entity: 'shutdown window' });
    expect(answer.headers['content-type']).toContain('text/csv; charset=utf-8');
    expect(answer.headers['content-disposition']).toBe(
      'attachment; filename="SALT-history-2026-12-01.csv"',
    );
    const lines = answer.text.split('\r\n');
    expect(lines[0]?.slice(1)).toMatch(/^number,recorded_at_utc,event_on,person/);
    expect(lines).toHaveLength(3);
    expect(lines[1]).toContain(`"'=HYPERLINK(""http://example.org""), planned ""T1"""`);
  });

  it('shows nothing of another site', async () => {
    const elsewhere = await addSite(plant.db, 'ELSE', 'Elsewhere Works');
    const stranger = as(plant.app, await plant.person('auditor', 'A Stranger', elsewhere));
    expect((await stranger.get('/api/history')).body.rows).toEqual([]);
    expect((await stranger.get(`/api/components/${vessel}/history`)).status).toBe(404);
    expect((await stranger.get('/api/history').query({ component: vessel })).body.rows).toEqual([]);
    expect((await stranger.get('/api/history.csv')).text.split('\r\n')).toHaveLength(2);
    expect((await stranger.get('/api/history/verify')).body.entries).toBe(0);
  });
});

async function addVessel({ db, siteId }: TestPlant): Promise<string> {
  const [unit, material, id] = [randomUUID(), randomUUID(), randomUUID()];
  await db.insert(units).values({ id: unit, siteId, code: 'U1', name: 'Reaction' });
  await db.insert(materials).values({
    id: material,
    siteId,
    name: 'Shell plate',
    yieldMpa: 300,
    tensileMpa: 480,
    youngsModulusMpa: 205_000,
    poissonsRatio: 0.3,
    toughnessMpaSqrtM: 110,
    toughnessTemperatureC: 20,
    origins: {},
  });
  await db.insert(components).values({
    id,
    siteId,
    unitId: unit,
    tag: 'R-401',
    description: 'Reactor',
    kind: 'vessel shell',
    insideDiameterMm: 1800,
    wallMm: 35,
    designPressureMpa: 5,
    designTemperatureC: 250,
    operatingPressureMpa: 4,
    operatingTemperatureC: 200,
    materialId: material,
    heatTreatment: 'as-welded',
    mechanism: 'fatigue',
  });
  return id;
}
