import { readFileSync } from 'node:fs';
import type { ImportRow, ImportView } from '@ligament/domain/contract/imports';
import { locations } from '@ligament/domain/schema/components';
import { findings, flaws } from '@ligament/domain/schema/flaws';
import { eq } from 'drizzle-orm';
import { addFinding, addReactor } from '../support/plant-records';
import { addSite, as, testPlant, type TestPlant } from '../support/test-plant';

let plant: TestPlant;

beforeAll(async () => {
  plant = await testPlant();
});
afterAll(() => plant.close());

const file = (name: string) => readFileSync(`seeds/files/${name}`);
const inspector = () => as(plant.app, plant.inspector);
const engineer = () => as(plant.app, plant.engineer);
const etag = (version: number) => `"${version}"`;

const BODY = {
  revision: 0,
  technique: 'PAUT',
  procedureNo: 'NDT-P-014 r5',
  plannedOn: null,
  inspectorName: 'I. Vaarala',
  certificateNo: 'INV-0457',
  certificateValidUntil: '2027-01-31',
  heightErrorMm: 0.7,
  lengthErrorMm: 3,
  sizingErrorSource: 'Qualification Q-12',
  scanSurface: 'outside',
  coveragePercent: 100,
  limitations: '',
  result: null,
  reinspectionId: null,
};
let report = 0;

async function inspectionOf(tag: string, inspectedOn = '2026-11-30', reportNo = '') {
  const reactor = await addReactor(plant.db, plant.siteId, tag);
  report += 1;
  const added = await inspector()
    .post(`/api/components/${reactor.component.id}/inspections`)
    .send({ ...BODY, reportNo: reportNo || `BW-${report}`, inspectedOn });
  expect(added.status).toBe(201);
  return { reactor, inspection: added.body as { id: string; version: number; reportNo: string } };
}

const upload = (inspectionId: string, bytes: Buffer, name = 'findings.csv') =>
  inspector().post(`/api/inspections/${inspectionId}/imports`).attach('file', bytes, name);

const change = (view: ImportView, body: object) =>
  inspector().patch(`/api/imports/${view.id}`).set('If-Match', etag(view.version)).send(body);

const rowOf = (view: ImportView, row: number): ImportRow => {
  const found = view.rows.find((each) => each.row === row);
  if (!found) throw new Error(`no row ${row}`);
  return found;
};
const levels = (row: ImportRow) => row.problems.map(({ level, field }) => `${level} ${field}`);
/** Tag and report number stand in the file; another reactor of the same kind needs its own. */
const forTag = (bytes: Buffer, tag: string, reportNo = `BW-${report}`) =>
  Buffer.from(
    bytes
      .toString('utf8')
      .replaceAll('R-401', tag)
      .replaceAll('R 401', tag.replace('-', ' '))
      .replaceAll(/BW-26-1\d\d/g, reportNo),
  );

describe('the import of an inspector’s file', () => {
  it('reads a file, tells two bad rows by row and column, and commits once they are fixed', async () => {
    const { reactor, inspection } = await inspectionOf('R-401', '2026-11-30', 'BW-26-140');
    const known = await addFinding(plant.db, reactor, {
      on: '2024-11-12',
      heightMm: 6.3,
      lengthMm: 66,
    });
    await plant.db.update(flaws).set({ axialMm: 1251 }).where(eq(flaws.id, known.flawId));
    const started = await upload(inspection.id, file('R-401_PAUT_two_bad_rows.csv'));
    expect(started.status).toBe(201);
    const view = started.body as ImportView;
    expect(view.reading).toMatchObject({ encoding: 'UTF-8', delimiter: ',', headerRow: 1 });
    expect(levels(rowOf(view, 4))).toEqual(['stop height']);
    expect(levels(rowOf(view, 5))).toEqual(['stop weld']);
    expect(rowOf(view, 4).problems[0]?.message).toContain(
      '31 mm is not less than the wall of 28 mm',
    );
    expect(view.summary).toMatchObject({ rows: 5, stopped: 2 });
    const early = await inspector().post(`/api/imports/${view.id}/commit`);
    expect(early.status).toBe(422);
    expect(
      (await plant.db.select().from(findings).where(eq(findings.inspectionId, inspection.id)))
        .length,
    ).toBe(0);

    const column = (field: string) =>
      view.mapping.find((each) => each.field === field)?.index ?? -1;
    const fixed = await change(view, {
      corrections: [
        { row: 4, column: column('height'), value: '3.1', reason: 'Decimal point lost, sheet 3' },
        { row: 5, column: column('weld'), value: 'L1', reason: 'Typing mistake, sheet 4' },
      ],
      decisions: [
        { row: 2, take: true, confirmed: false, flaw: { kind: 'continues', flawId: known.flawId } },
      ],
    });
    expect(fixed.status).toBe(200);
    const again = fixed.body as ImportView;
    expect(again.rows.filter(({ ready }) => !ready)).toEqual([]);
    expect(rowOf(again, 4).corrected).toEqual([column('height')]);
    expect(rowOf(again, 2).candidates[0]).toMatchObject({ flawId: known.flawId, distanceMm: 2 });
    const done = await inspector().post(`/api/imports/${view.id}/commit`);
    expect(done.status).toBe(200);
    expect(
      done.body.findings.map((each: { flawNumber: string; isNew: boolean }) => [
        each.flawNumber.slice(0, 5),
        each.isNew,
      ]),
    ).toEqual([
      ['R-401', false],
      ['R-401', true],
      ['R-401', true],
      ['R-401', true],
      ['R-401', true],
    ]);
    const [kept] = await plant.db.select().from(findings).where(eq(findings.rowNo, 4));
    expect(kept).toMatchObject({
      heightMm: 3.1,
      original: expect.objectContaining({ height_mm: '31.0' }),
    });
    const trail = await as(plant.app, plant.auditor).get(
      `/api/components/${reactor.component.id}/history?limit=100`,
    );
    const actions = trail.body.rows.map((row: { action: string }) => row.action);
    expect(actions).toEqual(
      expect.arrayContaining([
        'import.committed',
        'import.corrected',
        'import.started',
        'finding.recorded',
        'flaw.opened',
        'flaw.continued',
      ]),
    );
    const original = await inspector().get(`/api/documents/${view.documentId}`).buffer(true);
    expect(Buffer.from(original.text)).toEqual(file('R-401_PAUT_two_bad_rows.csv'));
  });

  it('recognises the same file and points to the first', async () => {
    const { reactor, inspection } = await inspectionOf('R-4011');
    const bytes = forTag(file('R-401_PAUT_two_bad_rows.csv'), 'R-4011');
    const first = (await upload(inspection.id, bytes)).body as ImportView;
    const second = (await upload(inspection.id, bytes)).body as ImportView;
    const leave = [4, 5].map((row) => ({ row, take: false, confirmed: false, flaw: null }));
    await change(first, { decisions: leave });
    await change(second, { decisions: leave });
    const both = await Promise.all(
      [first, second].map(({ id }) => inspector().post(`/api/imports/${id}/commit`)),
    );
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
    const count = await plant.db
      .select()
      .from(flaws)
      .where(eq(flaws.componentId, reactor.component.id));
    expect(count.length).toBe(3);
    const later = await upload(inspection.id, bytes);
    expect([later.status, later.body.detail]).toEqual([
      409,
      expect.stringContaining('This very file was imported on 2026-12-01'),
    ]);
  });

  it('reads what a colleague’s spreadsheet really sent: semicolons, decimal commas, clock positions, doubles', async () => {
    const { inspection } = await inspectionOf('R-4012', '2026-11-10');
    const started = await upload(inspection.id, forTag(file('R-401_as_sent.csv'), 'R-4012'));
    const view = started.body as ImportView;
    expect(view.reading).toMatchObject({ byteOrderMark: true, delimiter: ';', headerRow: 1 });
    expect(view.answers.decimalMark).toBe(',');
    expect(levels(rowOf(view, 2))).toContain('stop orientation');
    const answered = (await change(view, { answers: { orientation: 'axial' } })).body as ImportView;
    expect(rowOf(answered, 2).finding).toMatchObject({
      axialMm: 1250.5,
      heightMm: 7.6,
      lengthMm: 74,
      face: 'inside',
      indicationType: 'crack',
    });
    expect(levels(rowOf(answered, 2))).toEqual(['check circumferential']);
    expect(rowOf(answered, 3).finding).toMatchObject({ heightMm: 2, heightQualifier: '<' });
    expect(rowOf(answered, 4).problems[0]?.message).toContain('Equal to row 3');
    expect(rowOf(answered, 5).decision.take).toBe(false);
    expect(levels(rowOf(answered, 6))).toEqual(
      expect.arrayContaining(['check componentTag', 'hold circumferential', 'stop depthToTop']),
    );
    expect(levels(rowOf(answered, 7))).toEqual(
      expect.arrayContaining(['stop weld', 'stop height', 'stop circumferential']),
    );
  });

  it('never guesses a unit', async () => {
    const { inspection } = await inspectionOf('R-4013', '2026-11-10');
    const view = (
      await upload(
        inspection.id,
        Buffer.from('weld,height,length,opens to,orientation\nL1,0.3,1.5,ID,axial\n'),
      )
    ).body as ImportView;
    expect(rowOf(view, 2).finding).toBeNull();
    expect(rowOf(view, 2).problems[0]?.message).toContain('never guessed');
    const inches = (await change(view, { answers: { lengthUnit: 'in' } })).body as ImportView;
    expect(rowOf(inches, 2).finding).toMatchObject({ heightMm: 7.62, lengthMm: 38.1 });
  });

  it('asks again once an answer or a correction makes a row read otherwise', async () => {
    const { reactor, inspection } = await inspectionOf('R-4016');
    const known = await addFinding(plant.db, reactor, {
      on: '2024-11-12',
      heightMm: 5,
      lengthMm: 60,
    });
    await plant.db.update(flaws).set({ axialMm: 3000 }).where(eq(flaws.id, known.flawId));
    const bytes = Buffer.from(
      'weld,ind,axial mm,height,length,opens to,orientation\nL1,1,500,<0.9,2,ID,axial\n',
    );
    const view = (await upload(inspection.id, bytes)).body as ImportView;
    const mm = (await change(view, { answers: { lengthUnit: 'mm' } })).body as ImportView;
    const confirmed = (
      await change(mm, {
        decisions: [{ row: 2, take: true, confirmed: true, flaw: { kind: 'new' } }],
      })
    ).body as ImportView;
    expect(rowOf(confirmed, 2)).toMatchObject({ ready: true, decision: { confirmed: true } });
    const inches = (await change(confirmed, { answers: { lengthUnit: 'in' } })).body as ImportView;
    expect(rowOf(inches, 2)).toMatchObject({ ready: false, decision: { confirmed: false } });
    const column = view.mapping.find(({ field }) => field === 'axial')?.index ?? -1;
    const moved = (
      await change(inches, {
        answers: { lengthUnit: 'mm' },
        corrections: [{ row: 2, column, value: '3001', reason: 'Sheet 2' }],
      })
    ).body as ImportView;
    expect(rowOf(moved, 2).decision).toMatchObject({ confirmed: false, flaw: null });
    expect(rowOf(moved, 2).candidates[0]).toMatchObject({ flawId: known.flawId, distanceMm: 1 });
    expect((await inspector().post(`/api/imports/${view.id}/commit`)).status).toBe(422);
  });

  it('never continues a flaw of another weld', async () => {
    const { reactor, inspection } = await inspectionOf('R-4017');
    const known = await addFinding(plant.db, reactor, {
      on: '2024-11-12',
      heightMm: 5,
      lengthMm: 60,
    });
    const [other] = await plant.db
      .insert(locations)
      .values({ ...reactor.location, id: undefined, name: 'L2' })
      .returning();
    const bytes = Buffer.from(
      'weld,ind,height mm,length mm,opens to,orientation\nL2,1,4,30,ID,axial\n',
    );
    const view = (await upload(inspection.id, bytes)).body as ImportView;
    const flaw = { kind: 'continues' as const, flawId: known.flawId };
    const chosen = (
      await change(view, { decisions: [{ row: 2, take: true, confirmed: true, flaw }] })
    ).body as ImportView;
    expect(rowOf(chosen, 2)).toMatchObject({ ready: false });
    expect(rowOf(chosen, 2).problems.at(-1)?.message).toContain('does not lie in L2');
    expect((await inspector().post(`/api/imports/${view.id}/commit`)).status).toBe(422);
    const byHand = await inspector()
      .post(`/api/inspections/${inspection.id}/findings`)
      .send({
        ...{ indicationNo: '9', locationId: other?.id, indicationType: 'crack', kind: 'surface' },
        ...{ face: 'inside', orientation: 'axial', heightMm: 5, lengthMm: 40, ligamentMm: null },
        ...{ axialMm: 100, circumferentialMm: null, wallMm: null, remarks: '', flaw },
      });
    expect([byHand.status, byHand.body.type]).toEqual([
      422,
      expect.stringContaining('finding.other-weld'),
    ]);
  });

  it.each([
    [
      'a spreadsheet workbook',
      Buffer.from([0x50, 0x4b, 0x03, 0x04, 20, 0]),
      'spreadsheet workbook',
    ],
    ['a program', Buffer.from('MZ\u0000\u0000'), 'a program for Windows'],
    ['binary data', Buffer.from([65, 0, 66, 0, 67]), 'binary data'],
    ['an empty table', Buffer.from('weld,height\n'), 'no line below'],
  ])('refuses %s by name', async (_what, bytes, words) => {
    const { inspection } = await inspectionOf(`X-${report}`);
    const refused = await upload(inspection.id, bytes);
    expect([refused.status, refused.body.detail]).toEqual([422, expect.stringContaining(words)]);
  });

  it('keeps findings out once the report is handed over, and lets another person accept it', async () => {
    const { reactor, inspection } = await inspectionOf('R-4014');
    const finding = {
      indicationNo: '1',
      locationId: reactor.location.id,
      indicationType: 'crack',
      kind: 'surface',
      face: 'inside',
      orientation: 'axial',
      heightMm: 5,
      lengthMm: 40,
      ligamentMm: null,
      axialMm: 100,
      circumferentialMm: null,
      wallMm: null,
      remarks: '',
      flaw: { kind: 'new' },
    };
    const deep = await inspector()
      .post(`/api/inspections/${inspection.id}/findings`)
      .send({ ...finding, heightMm: 29 });
    expect([deep.status, deep.body.errors[0].field]).toEqual([422, 'heightMm']);
    expect(
      (await inspector().post(`/api/inspections/${inspection.id}/findings`).send(finding)).status,
    ).toBe(201);
    const path = `/api/inspections/${inspection.id}`;
    const early = await inspector()
      .post(`${path}/submit`)
      .set('If-Match', etag(inspection.version));
    expect([early.status, early.body.errors.map((each: { field: string }) => each.field)]).toEqual([
      422,
      ['result'],
    ]);
    const told = await inspector()
      .patch(path)
      .set('If-Match', etag(inspection.version))
      .send({ result: 'indications recorded' });
    const sent = await inspector().post(`${path}/submit`).set('If-Match', etag(told.body.version));
    expect(sent.body.state).toBe('submitted');
    expect(
      (await inspector().post(`${path}/accept`).set('If-Match', etag(sent.body.version))).status,
    ).toBe(403);
    expect((await upload(inspection.id, Buffer.from('weld,height\nL1,3\n'))).status).toBe(422);
    const accepted = await engineer()
      .post(`${path}/accept`)
      .set('If-Match', etag(sent.body.version));
    expect([accepted.status, accepted.body.state]).toEqual([200, 'accepted']);
  });

  it('is not to be had by other roles or other sites', async () => {
    const { inspection } = await inspectionOf('R-4015');
    const view = (
      await upload(inspection.id, forTag(file('R-401_PAUT_two_bad_rows.csv'), 'R-4015'))
    ).body as ImportView;
    for (const person of [plant.planner, plant.operations, plant.administrator]) {
      expect((await as(plant.app, person).get(`/api/imports/${view.id}`)).status).toBe(403);
    }
    const stranger = as(
      plant.app,
      await plant.person('inspector', 'Stranger', await addSite(plant.db, 'OTHR', 'Other')),
    );
    expect((await stranger.get(`/api/imports/${view.id}`)).status).toBe(404);
    expect((await stranger.post(`/api/imports/${view.id}/commit`)).status).toBe(404);
    expect((await stranger.get(`/api/documents/${view.documentId}`)).status).toBe(404);
    expect((await stranger.get(`/api/inspections/${inspection.id}`)).status).toBe(404);
  });
});
