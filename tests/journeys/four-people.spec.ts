import type { Page } from 'playwright-core';
import { runReminders } from '../../apps/api/src/modules/reminders/run-reminders';
import { DEMO_PASSWORD } from '../../seeds/plant/people';
import { leave, runningPlant, signIn, type RunningPlant } from '../support/running-plant';

// One story in four parts, each as its own person from the sign-in page; every part builds on the one before.
let plant: RunningPlant;
/** The new due date, as the screens write it and as a calendar date. */
let due = '';

beforeAll(async () => {
  plant = await runningPlant({ demo: true });
}, 180_000);
afterAll(() => plant?.close());

async function giveReason(page: Page, reason: string): Promise<void> {
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('textbox').first().fill(reason);
  await dialog.getByRole('button').last().click();
  await dialog.waitFor({ state: 'hidden' });
}

describe('from an inspector’s file to a signed decision, a date, a reminder and a record', () => {
  it('the inspector uploads a table with two bad rows, fixes them, and commits', async () => {
    const page = await signIn(plant, 'ines');
    await page.getByRole('link', { name: 'BW-26-140, R-401' }).click();
    await page
      .locator('input[type=file]')
      .first()
      .setInputFiles('seeds/files/R-401_PAUT_two_bad_rows.csv');
    await page.waitForURL('**/inspections/imports/**');
    await page.getByText('Nothing is stored until you commit').waitFor();
    expect(await page.getByText('31 mm is not less than the wall of 28 mm').count()).toBe(1);
    expect(await page.getByText('R-401 has no weld or place “L9”').count()).toBe(1);
    const commit = page.getByRole('button', { name: /^Commit/ });
    expect(await commit.isDisabled()).toBe(true);

    const height = page.getByLabel('Row 4, Height through the wall');
    await height.fill('3.1');
    await height.press('Tab');
    await giveReason(page, 'Decimal point lost, see sheet 3');
    await page.getByText('31 mm is not less').waitFor({ state: 'hidden' });
    const weld = page.getByLabel('Row 5, Weld or place');
    await weld.fill('L1');
    await weld.press('Tab');
    await giveReason(page, 'Typing mistake, see sheet 4');
    await page.getByText('has no weld or place').waitFor({ state: 'hidden' });
    await page
      .getByLabel('Flaw of row 2')
      .selectOption({ label: await continuing(page, 'R-401-F01') });
    await page.getByText('5 of 5 rows are ready').waitFor();
    await commit.click();
    await page.getByRole('dialog').getByRole('button', { name: 'Commit' }).click();
    await page.waitForURL(/\/inspections\/[0-9a-f-]+$/);
    await page.getByRole('link', { name: 'R-401-F01' }).waitFor();
    expect(await page.getByRole('link', { name: /^R-401-F0[2-5]$/ }).count()).toBe(4);

    await page.getByRole('link', { name: 'Change' }).click();
    await page.getByLabel('Result').selectOption({ label: 'indications recorded' });
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('button', { name: 'Hand the report over' }).click();
    await page.getByText('Nothing is accepted yet').waitFor();
    await leave(page);
  });

  it('the engineer assesses the worst flaw and sends it; a second engineer approves', async () => {
    const page = await signIn(plant, 'tomas');
    await page.getByRole('link', { name: 'BW-26-140, R-401' }).click();
    await page.getByRole('button', { name: 'Accept the report' }).click();
    await page.getByRole('link', { name: 'R-401-F01' }).click();
    await page.getByRole('button', { name: 'Start a draft' }).click();
    await page.waitForURL('**/assessments/**');
    await page
      .getByText(/near the limit|Acceptable/i)
      .first()
      .waitFor();
    await page
      .getByLabel(/Acceptable until when/)
      .fill('Acceptable until the re-inspection at the present pressure and cycles.');
    await page.getByRole('button', { name: 'Send for check' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Sign and send' }).click();
    await page.getByText('Waiting for the independent check').waitFor();
    expect(await page.getByRole('button', { name: 'Approve', exact: true }).count()).toBe(0);
    await leave(page);

    const checker = await signIn(plant, 'amara');
    await checker.getByRole('link', { name: /^R-401-F01, revision/ }).click();
    await checker.getByRole('heading', { name: 'Independent check' }).waitFor();
    for (const point of await checker.locator('app-review-panel input[type=checkbox]').all()) {
      await point.check();
    }
    await checker.getByRole('button', { name: 'Approve', exact: true }).click();
    const dialog = checker.getByRole('dialog');
    await dialog.getByRole('textbox').first().fill('Inputs and steps checked');
    await dialog.locator('input[type=password]').fill(DEMO_PASSWORD);
    await dialog.getByRole('button').last().click();
    await dialog.waitFor({ state: 'hidden' });
    await checker.getByText('reviewed and approved').first().waitFor();
    await leave(checker);
  });

  it('the planner sees the new date and puts it into a shutdown window; the reminder arrives when its lead time is reached', async () => {
    const page = await signIn(plant, 'joost');
    await page.goto(`${plant.base}/schedule?show=table&search=R-401`);
    const row = page.getByRole('row', { name: /R-401/ });
    due = (await row.getByRole('link').first().textContent()) ?? '';
    expect(due).toMatch(/^\d+ \w{3} 2027$/);
    await row.getByRole('link').first().click();
    await page.getByLabel('Plan into').selectOption({ label: 'SD-27A (fits)' });
    expect(await page.getByLabel('Day', { exact: true }).inputValue()).toBe('2027-02-08');
    await page.getByRole('button', { name: 'Plan', exact: true }).click();
    await page.getByText('planned in SD-27A on 2027-02-08').first().waitFor();
    await leave(page);

    const dueOn = new Date(`${due} 09:00 UTC`);
    const daysBefore = (days: number) => new Date(dueOn.getTime() - days * 86_400_000);
    plant.clock.set(daysBefore(61));
    await runReminders(plant.deps, plant.mailer);
    const early = await signIn(plant, 'joost');
    await early.goto(`${plant.base}/mailbox`);
    const subject = /R-401 L1 – flaw R-401-F01, accepted until then – planned in SD-27A/;
    await early.getByRole('link', { name: subject }).first().waitFor();
    const before = await early.getByRole('link', { name: subject }).count();
    await early.close();
    plant.clock.set(daysBefore(60));
    await runReminders(plant.deps, plant.mailer);
    await runReminders(plant.deps, plant.mailer);
    const later = await signIn(plant, 'joost');
    await later.goto(`${plant.base}/mailbox`);
    await later.getByRole('link', { name: subject }).first().waitFor();
    // planner, two engineers and, from sixty days on, the inspector: one mail each, however often it runs
    expect(await later.getByRole('link', { name: subject }).count()).toBe(before + 4);
    await later.getByRole('link', { name: subject }).first().click();
    await later.getByText('(60 days left)').waitFor();
    await leave(later);
  });

  it('the auditor opens the component and reads all of that, with names and times', async () => {
    plant.clock.set(new Date('2026-12-01T15:00:00Z'));
    const page = await signIn(plant, 'mirela');
    await page.goto(`${plant.base}/register?search=R-401`);
    await page.getByRole('link', { name: 'R-401', exact: true }).click();
    await page.getByRole('main').getByRole('link', { name: 'History' }).click();
    await page.waitForURL('**/history/components/**');
    const thread = page.getByRole('main');
    for (const words of [
      'planned in SD-27A on 2027-02-08',
      'approved: ',
      'sent for check',
      'Inspection report BW-26-140 accepted',
      'committed for report BW-26-140: 5 findings, 4 of them new flaws',
    ]) {
      await thread.getByText(words).first().waitFor();
    }
    for (const name of ['Ines Vaarala', 'Tomas Kerrow', 'Amara Lindqvist-Obi', 'Joost Pellam']) {
      expect(await thread.getByText(name).count()).toBeGreaterThan(0);
    }
    await leave(page);
  });

  it('raised no script error and no refused content on the way', () => {
    expect(plant.faults).toEqual([]);
  });
});

/** The choice that continues a known flaw, with its size and distance in its words. */
async function continuing(page: Page, number: string): Promise<string> {
  const options = await page.getByLabel('Flaw of row 2').locator('option').allTextContents();
  return (
    options.map((each) => each.trim()).find((each) => each.includes(`continues ${number}`)) ?? ''
  );
}
