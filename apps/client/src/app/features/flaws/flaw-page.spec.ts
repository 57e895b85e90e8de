import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { FlawView } from '@ligament/domain/contract/flaws';
import type { Role } from '@ligament/domain/contract/policy';
import { Session } from '../../core/session/session';
import {
  ASSESSMENT_ID,
  assessmentOf,
  FLAW_ID,
  findingOf,
  flawOf,
} from '../../shared/assessed/testing/assessment-of';
import { sessionOf } from '../../testing/session-of';
import { FlawPage } from './flaw-page';
import { flawRowsCsv } from './flaw-rows-csv';

const row = (state: 'approved' | 'draft' | 'superseded') => ({
  id: ASSESSMENT_ID,
  revision: 1,
  state,
  inspectedOn: '2026-11-10',
  verdict: 'acceptable' as const,
  lifeYears: 12,
  chosenDueOn: '2028-11-10',
  authorName: 'Tom Kerr',
  reviewerName: state === 'approved' ? 'Mira Oduya' : null,
  approvedAt: null,
  updatedAt: '2026-12-01T09:00:00.000Z',
});

describe('the page of a flaw', () => {
  let page: ComponentFixture<FlawPage>;
  const text = () =>
    ((page.nativeElement as HTMLElement).textContent ?? '').replaceAll(/\s+/g, ' ');

  async function open(flaw: FlawView, role: Role = 'engineer') {
    TestBed.configureTestingModule({
      providers: [provideRouter([]), provideHttpClient(), provideHttpClientTesting()],
    });
    TestBed.inject(Session).remember(sessionOf(role));
    const server = TestBed.inject(HttpTestingController);
    page = TestBed.createComponent(FlawPage);
    page.componentRef.setInput('id', FLAW_ID);
    await page.whenStable();
    server.expectOne(`/api/flaws/${FLAW_ID}`).flush(flaw);
    await page.whenStable();
    const state = flaw.assessments[0]?.state;
    server
      .match(`/api/assessments/${ASSESSMENT_ID}`)
      .forEach((each) =>
        each.flush(assessmentOf(state ? { state, reviewerName: 'Mira Oduya' } : {})),
      );
    const { input, outcome, proposal } = assessmentOf();
    server
      .match(`/api/flaws/${FLAW_ID}/assessment-inputs`)
      .forEach((each) =>
        each.flush({ input, inspectedOn: '2026-11-10', mechanism: 'fatigue', findingId: 'x' }),
      );
    await page.whenStable();
    server.match('/api/assessments/preview').forEach((each) => each.flush({ outcome, proposal }));
    await page.whenStable();
  }

  it('answers acceptable or not, until when and why, from the assessment in force', async () => {
    await open(flawOf({ assessments: [row('approved')] }));
    expect(text()).toContain('Acceptable, to be inspected again by 10 Nov 2028.');
    expect(text()).toContain('signed by Tom Kerr and Mira Oduya');
    expect(text()).not.toContain('not signed');
  });

  it('takes the date of the re-inspection that is really open', async () => {
    const reinspection = {
      id: FLAW_ID,
      dueOn: '2027-05-01',
      limitOn: null,
      basis: 'Chosen by the engineer.',
      state: 'open' as const,
      windowCode: null,
      plannedOn: null,
      urgency: 'due soon' as const,
    };
    await open(flawOf({ assessments: [row('approved')], reinspection }));
    expect(text()).toContain('to be inspected again by 1 May 2027.');
  });

  it('gives no date from a draft, and says that it is not signed', async () => {
    await open(flawOf({ assessments: [row('draft')] }));
    expect(text()).toContain('Draft, not signed.');
    expect(text()).toContain('Not signed yet: acceptable as computed.');
    expect(text()).not.toContain('to be inspected again by');
  });

  it('computes provisionally what nobody has assessed, for those who may', async () => {
    await open(flawOf(), 'inspector');
    expect(text()).toContain('Provisional, not signed.');
    TestBed.resetTestingModule();
    await open(flawOf(), 'planner');
    expect(text()).toContain('Not assessed yet.');
  });

  it('warns of a finding that the assessment does not know', async () => {
    const newer = findingOf({
      id: FLAW_ID,
      reportNo: 'T-9',
      inspectedOn: '2027-03-01',
      heightMm: 6,
    });
    await open(flawOf({ assessments: [row('approved')], findings: [findingOf(), newer] }));
    expect(text()).toContain('A newer finding is not in this assessment: report T-9');
  });

  it('refers what is out of scope and offers no assessment', async () => {
    await open(flawOf({ scope: 'Refer it to a specialist.' }));
    expect(text()).toContain('Not assessed here: referred. Refer it to a specialist.');
    expect(text()).not.toContain('Start a draft');
  });

  it('offers an assessment only to those who may make one', async () => {
    await open(flawOf());
    expect(text()).toContain('Start a draft');
    TestBed.resetTestingModule();
    await open(flawOf(), 'auditor');
    expect(text()).not.toContain('Start a draft');
    expect(text()).not.toContain('Change');
  });
});

describe('the exported list', () => {
  it('says that a flaw is not assessed rather than leaving the verdict empty', () => {
    const flaw = flawOf();
    const csv = flawRowsCsv([
      {
        ...flaw,
        locationName: flaw.location.name,
        heightMm: 4,
        lengthMm: 24,
        inspectedOn: '2026-11-10',
        verdict: null,
        lifeYears: null,
        dueOn: null,
        urgency: null,
        openAssessment: null,
      },
    ]);
    expect(csv.split('\r\n')[1]).toBe(
      'R-401-F01,U400,R-401,L1,surface,inside,fatigue,4,24,2026-11-10,not assessed,,,,accepted with conditions,',
    );
  });
});
