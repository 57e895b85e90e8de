import { inspections } from '@ligament/domain/schema/inspections';
import {
  reinspections,
  receivedMails,
  reminders,
  outgoingMails,
} from '@ligament/domain/schema/schedule';
import { eq } from 'drizzle-orm';
import { startMail } from '../../apps/api/src/mail/start-mail';
import type { Mailer } from '../../apps/api/src/mail/mailer';
import { runReminders } from '../../apps/api/src/modules/reminders/run-reminders';
import { sendQueuedMails } from '../../apps/api/src/modules/mails/send-queued-mails';
import { addFinding, addReactor } from '../support/plant-records';
import { addSite, as, testPlant, type TestPlant } from '../support/test-plant';

let plant: TestPlant;

beforeEach(async () => {
  plant = await testPlant();
});
afterEach(() => plant.close());

const planner = () => as(plant.app, plant.planner);
const etag = (version: number) => `"${version}"`;
const at = (day: string) => plant.clock.set(new Date(`${day}T09:00:00Z`));

async function task(dueOn: string, more: Partial<typeof reinspections.$inferInsert> = {}) {
  const reactor = await addReactor(plant.db, plant.siteId);
  const { flawId, inspection } = await addFinding(plant.db, reactor, {
    on: '2026-11-10',
    heightMm: 5,
    lengthMm: 50,
  });
  const [row] = await plant.db
    .insert(reinspections)
    .values({
      siteId: plant.siteId,
      componentId: reactor.component.id,
      flawId,
      task: 'PAUT of the seam',
      technique: 'PAUT',
      dueOn,
      basis: 'Half of the remaining life',
      candidates: [],
      ...more,
    })
    .returning();
  if (!row) throw new Error('no task');
  return { reactor, inspection, task: row };
}

async function windowOf(
  unitIds: string[],
  code = 'SD-27A',
  startsOn = '2027-02-08',
  endsOn = '2027-02-14',
) {
  const added = await planner().post('/api/shutdown-windows').send({
    code,
    name: '',
    kind: 'short shutdown',
    startsOn,
    endsOn,
    scopeFreezeOn: null,
    state: 'planned',
    unitIds,
  });
  expect(added.status).toBe(201);
  return added.body as { id: string; version: number };
}

describe('the due list', () => {
  it('shows what is overdue, due soon and later, and explains how each stands', async () => {
    const late = await task('2026-11-12');
    await task('2027-03-01');
    await task('2029-01-01');
    await windowOf([late.reactor.unit.id], 'SD-26Z', '2026-11-01', '2026-11-05');
    const all = await planner().get('/api/reinspections');
    expect(
      all.body.rows.map((row: { urgency: string; daysLeft: number; fit: string }) => [
        row.urgency,
        row.daysLeft,
        row.fit,
      ]),
    ).toEqual([
      ['overdue', -19, 'overdue, no window'],
      ['due soon', 90, 'no window before the date'],
      ['later', 762, 'no window before the date'],
    ]);
    const only = await planner().get('/api/reinspections?urgency=overdue');
    expect(only.body.rows).toHaveLength(1);
  });

  it('plans into a window of the unit, never after the due date, and the due date is not the planner’s to move', async () => {
    const { task: row, reactor } = await task('2027-02-10');
    const window = await windowOf([reactor.unit.id]);
    const other = await windowOf(
      [(await addReactor(plant.db, plant.siteId)).unit.id],
      'TA-27',
      '2027-01-03',
      '2027-01-28',
    );
    const plan = (body: object, version = row.version) =>
      planner()
        .post(`/api/reinspections/${row.id}/plan`)
        .set('If-Match', etag(version))
        .send({ note: '', ...body });
    const late = await plan({ windowId: window.id, plannedOn: '2027-02-12' });
    expect([late.status, late.body.detail]).toEqual([422, expect.stringContaining('deferral')]);
    expect((await plan({ windowId: other.id, plannedOn: '2027-01-05' })).body.detail).toContain(
      'covers',
    );
    expect((await plan({ windowId: window.id, plannedOn: '2027-01-05' })).status).toBe(422);
    expect(
      (await plan({ windowId: window.id, plannedOn: '2027-02-09', dueOn: '2030-01-01' })).status,
    ).toBe(400);
    const good = await plan({ windowId: window.id, plannedOn: '2027-02-09' });
    expect([good.status, good.body.state, good.body.fit]).toEqual([
      200,
      'planned',
      'planned in SD-27A on 2027-02-09',
    ]);
    expect((await plan({ windowId: window.id, plannedOn: '2027-02-08' })).status).toBe(412);
    const moved = await planner()
      .patch(`/api/shutdown-windows/${window.id}`)
      .set('If-Match', etag(window.version))
      .send({ startsOn: '2027-02-15', endsOn: '2027-02-20', reason: 'Spare part late' });
    expect(moved.body.released).toMatchObject([{ id: row.id }]);
    const again = await planner().get(`/api/reinspections/${row.id}`);
    expect(again.body).toMatchObject({ state: 'open', windowId: null });
    const trail = await as(plant.app, plant.auditor).get(
      `/api/components/${reactor.component.id}/history`,
    );
    expect(trail.body.rows.map((each: { action: string }) => each.action)).toEqual(
      expect.arrayContaining(['re-inspection.planned', 're-inspection.unplanned']),
    );
  });

  it('is read by everybody and planned by planners alone, on their own site', async () => {
    const { task: row } = await task('2027-02-10');
    for (const person of [
      plant.inspector,
      plant.engineer,
      plant.operations,
      plant.auditor,
      plant.administrator,
    ]) {
      expect((await as(plant.app, person).get('/api/reinspections')).status).toBe(200);
      expect(
        (
          await as(plant.app, person)
            .post(`/api/reinspections/${row.id}/plan`)
            .set('If-Match', '"1"')
            .send({ windowId: null, plannedOn: '2027-01-10', note: '' })
        ).status,
      ).toBe(403);
    }
    const stranger = as(
      plant.app,
      await plant.person('planner', 'Stranger', await addSite(plant.db, 'OTHR', 'Other')),
    );
    expect((await stranger.get(`/api/reinspections/${row.id}`)).status).toBe(404);
    expect((await stranger.get('/api/reinspections')).body.rows).toEqual([]);
  });
});

describe('reminders', () => {
  it('arrive in the mailbox when their lead time is reached, once, over any number of runs', async () => {
    const { task: row } = await task('2027-07-23');
    const mail = await startMail(plant.deps);
    const run = () => runReminders(plant.deps, mail.mailer);
    at('2027-01-23');
    expect(await run()).toEqual({ queued: 0, sent: 0, failed: 0 });
    at('2027-01-24');
    expect(await run()).toEqual({ queued: 3, sent: 3, failed: 0 });
    expect(await run()).toEqual({ queued: 0, sent: 0, failed: 0 });
    // three stages missed: only the newest is sent
    at('2027-07-20');
    expect(await run()).toEqual({ queued: 4, sent: 4, failed: 0 });
    const received = await plant.db.select().from(receivedMails);
    expect(received).toHaveLength(7);
    const [first] = received;
    expect(first?.subject).toContain('[Due 2027-07-23]');
    expect(first?.text).toContain('Latest finish: 2027-07-08');
    expect(first?.text).toContain(`/schedule/${row.id}`);
    expect(new Set(received.map(({ messageId }) => messageId)).size).toBe(7);
    const list = await as(plant.app, await plant.person('planner', 'Later planner')).get(
      '/api/reminders?limit=10',
    );
    expect(list.body.rows.map(({ state }: { state: string }) => state)).toEqual(
      Array(7).fill('sent'),
    );
    await mail.close();
  });

  it('stop when the task is done, and never tell an old date', async () => {
    const { task: row, inspection } = await task('2026-12-10');
    const { queueReminders } = await import('../../apps/api/src/modules/reminders/queue-reminders');
    expect(await queueReminders(plant.deps)).toBe(4);
    const { completeReinspections } =
      await import('../../apps/api/src/modules/reinspections/complete-reinspections');
    await plant.db.transaction((tx) =>
      completeReinspections(
        tx,
        { siteId: plant.siteId, personId: null, name: 'Test', role: 'engineer', requestId: '' },
        plant.clock.now(),
        {
          componentId: row.componentId,
          inspectionId: inspection.id,
          reportNo: 'R',
          flawIds: [row.flawId ?? ''],
        },
      ),
    );
    const sent: string[] = [];
    const mailer: Mailer = { send: async ({ to }) => void sent.push(to), close: () => undefined };
    expect(await sendQueuedMails(plant.deps, mailer)).toEqual({ sent: 0, failed: 0 });
    expect(sent).toEqual([]);
    expect(await queueReminders(plant.deps)).toBe(0);
  });

  it('are told after all when the report that fulfilled the task is declared void', async () => {
    const { task: row, inspection } = await task('2026-12-10', { plannedOn: '2026-12-05' });
    const { queueReminders } = await import('../../apps/api/src/modules/reminders/queue-reminders');
    const queued = await queueReminders(plant.deps);
    expect(queued).toBeGreaterThan(0);
    const path = `/api/inspections/${inspection.id}`;
    await plant.db
      .update(inspections)
      .set({ state: 'submitted' })
      .where(eq(inspections.id, inspection.id));
    const engineer = as(plant.app, plant.engineer);
    const seen = (await engineer.get(path)).body as { version: number };
    const accepted = await engineer.post(`${path}/accept`).set('If-Match', etag(seen.version));
    expect(accepted.body.state).toBe('accepted');
    const stateOf = async () =>
      (await plant.db.select().from(reinspections).where(eq(reinspections.id, row.id)))[0];
    expect(await stateOf()).toMatchObject({ state: 'done', doneInspectionId: inspection.id });
    const sent: string[] = [];
    const mailer: Mailer = { send: async ({ to }) => void sent.push(to), close: () => undefined };
    expect(await sendQueuedMails(plant.deps, mailer)).toEqual({ sent: 0, failed: 0 });
    const gone = await engineer
      .post(`${path}/void`)
      .set('If-Match', etag(accepted.body.version))
      .send({ reason: 'Wrong vessel' });
    expect([gone.status, gone.body.state]).toEqual([200, 'void']);
    expect(await stateOf()).toMatchObject({ state: 'planned', doneInspectionId: null });
    expect(await sendQueuedMails(plant.deps, mailer)).toEqual({ sent: queued, failed: 0 });
    expect(sent.length).toBe(queued);
  });

  it('are tried again after a failure, parked after a refusal for good, and two senders never send one twice', async () => {
    await task('2026-12-10');
    const { queueReminders } = await import('../../apps/api/src/modules/reminders/queue-reminders');
    await queueReminders(plant.deps);
    const failing = (responseCode?: number): Mailer => ({
      send: () => Promise.reject(Object.assign(new Error('refused'), { responseCode })),
      close: () => undefined,
    });
    expect(await sendQueuedMails(plant.deps, failing(451))).toEqual({ sent: 0, failed: 4 });
    expect(await sendQueuedMails(plant.deps, failing(451))).toEqual({ sent: 0, failed: 0 });
    plant.clock.set(new Date(plant.clock.now().getTime() + 10 * 60_000));
    const seen: string[] = [];
    const mailer: Mailer = {
      send: async ({ messageId }) => void seen.push(messageId),
      close: () => undefined,
    };
    await Promise.all([sendQueuedMails(plant.deps, mailer), sendQueuedMails(plant.deps, mailer)]);
    expect([seen.length, new Set(seen).size]).toEqual([4, 4]);
    await task('2026-12-11');
    await queueReminders(plant.deps);
    await sendQueuedMails(plant.deps, failing(550));
    const parked = await plant.db
      .select()
      .from(outgoingMails)
      .where(eq(outgoingMails.state, 'not delivered'));
    expect(parked).toHaveLength(4);
    const shown = await plant.db
      .select()
      .from(reminders)
      .where(eq(reminders.state, 'not delivered'));
    expect(shown).toHaveLength(4);
    expect((await planner().get('/api/reminders/heartbeat')).body.undelivered).toBe(4);
  });

  it('hides one-time links from everybody but administrators', async () => {
    const mail = await startMail(plant.deps);
    const admin = as(plant.app, plant.administrator);
    const invited = await admin.post('/api/users').send({
      name: 'New Person',
      email: 'new.person@example.org',
      role: 'inspector',
      organisation: 'Northgate',
      competence: '',
      certificateNo: '',
      certificateValidUntil: null,
      accessUntil: null,
    });
    expect(invited.status).toBe(201);
    expect(await sendQueuedMails(plant.deps, mail.mailer)).toEqual({ sent: 1, failed: 0 });
    expect((await admin.get('/api/mails')).body.rows).toHaveLength(1);
    expect((await planner().get('/api/mails')).body.rows).toEqual([]);
    await mail.close();
  });
});

describe('Today', () => {
  it('shows each person what needs them', async () => {
    await task('2026-11-12');
    const forPlanner = await planner().get('/api/today');
    expect(forPlanner.body.groups[0]).toMatchObject({
      key: 'overdue',
      count: 1,
      link: '/schedule?urgency=overdue',
    });
    const forEngineer = await as(plant.app, plant.engineer).get('/api/today');
    expect(forEngineer.body.groups.map(({ key }: { key: string }) => key)).toEqual(
      expect.arrayContaining(['overdue', 'new']),
    );
    for (const person of [plant.inspector, plant.operations, plant.auditor, plant.administrator]) {
      expect((await as(plant.app, person).get('/api/today')).status).toBe(200);
    }
  });
});
