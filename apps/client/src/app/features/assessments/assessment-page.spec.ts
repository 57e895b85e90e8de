import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { Role } from '@ligament/domain/contract/policy';
import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { problemInterceptor } from '../../core/http/problem-interceptor';
import { Session } from '../../core/session/session';
import { ASSESSMENT_ID, assessmentOf, flawOf } from '../../shared/assessed/testing/assessment-of';
import { sessionOf } from '../../testing/session-of';
import { AssessmentPage } from './assessment-page';

const PATH = `/api/assessments/${ASSESSMENT_ID}`;
const wait = (ms: number) => new Promise((done) => setTimeout(done, ms));

describe('the workbench of an assessment', () => {
  let server: HttpTestingController;
  let page: ComponentFixture<AssessmentPage>;
  const root = () => page.nativeElement as HTMLElement;
  const text = () => root().textContent ?? '';

  async function open(view: AssessmentView, role: Role = 'engineer') {
    TestBed.configureTestingModule({
      providers: [
        provideRouter([]),
        provideHttpClient(withInterceptors([problemInterceptor])),
        provideHttpClientTesting(),
      ],
    });
    TestBed.inject(Session).remember(sessionOf(role));
    server = TestBed.inject(HttpTestingController);
    page = TestBed.createComponent(AssessmentPage);
    page.componentRef.setInput('id', ASSESSMENT_ID);
    await page.whenStable();
    server.expectOne(PATH).flush(view);
    await settle(view);
  }

  /** Answers whatever else the page asks for, and lets the live computation run. */
  async function settle(view: AssessmentView) {
    await page.whenStable();
    for (const { request, flush } of pending()) flush(answerTo(request.url, view));
    await wait(220);
    await page.whenStable();
    page.detectChanges();
  }

  const pending = () =>
    server
      .match(({ method }) => method === 'GET')
      .map((each) => ({ request: each.request, flush: (body: object) => each.flush(body) }));

  function answerTo(url: string, { input }: AssessmentView): object {
    if (url.endsWith('/assessment-inputs')) return { input, inspectedOn: '', mechanism: 'fatigue' };
    if (url === '/api/site-rules') return { current: { rules: DEFAULT_SITE_RULES }, versions: [] };
    return url.startsWith('/api/flaws/') ? flawOf() : { rows: [] };
  }

  function type(id: string, value: string) {
    const field = root().querySelector<HTMLInputElement>(`#${id}`);
    if (!field) throw new Error(`no field ${id}`);
    field.value = value;
    field.dispatchEvent(new Event('input'));
  }

  const button = (words: string) => {
    const found = [...root().querySelectorAll('button')].find(
      (each) => each.textContent?.trim() === words,
    );
    if (!found) throw new Error(`no button ${words}`);
    return found;
  };

  it('computes again on every change, without asking the server', async () => {
    const view = assessmentOf();
    await open(view);
    expect(root().querySelector('.verdict')?.textContent).toContain('acceptable');
    type('input-stress-primaryMembraneMPa', '400');
    await wait(220);
    await page.whenStable();
    expect(root().querySelector('.verdict')?.textContent).toContain('Not acceptable');
    expect(text()).toContain('overrides the register’s 120 MPa');
    server.verify();
  });

  it('saves inputs, conclusion and date at the version seen', async () => {
    await open(assessmentOf());
    type('input-flaw-heightMm', '5');
    type('conclusion', 'Acceptable until inspected again.');
    await wait(220);
    await page.whenStable();
    button('Save draft').click();
    const { request } = server.expectOne(({ method, url }) => method === 'PATCH' && url === PATH);
    expect(request.headers.get('If-Match')).toBe('"3"');
    expect(request.body).toMatchObject({
      conclusion: 'Acceptable until inspected again.',
      input: { flaw: { heightMm: { value: 5 } } },
    });
  });

  it('says what is left to do before it can be sent', async () => {
    await open(assessmentOf());
    expect(button('Send for check').disabled).toBe(true);
    expect(text()).toContain('Write the conclusion');
    type('conclusion', 'Acceptable until inspected again.');
    await page.whenStable();
    expect(button('Send for check').disabled).toBe(false);
  });

  it('names input, limit and value when the method does not hold', async () => {
    await open(assessmentOf({}, { height: 24.5, length: 60 }));
    const refusal = root().querySelector('app-refusal-notice')?.textContent ?? '';
    expect(refusal).toContain('No verdict can be given');
    expect(refusal).toContain('Through-wall extent');
    expect(root().querySelector('app-figure-strip')).toBeNull();
  });

  it('lets another engineer check, with inputs to read only, once every point is ticked', async () => {
    await open(assessmentOf({ state: 'submitted', conclusion: 'Acceptable.' }));
    expect(root().querySelector('#input-flaw-heightMm')).toBeNull();
    expect(button('Approve').disabled).toBe(true);
    for (const box of root().querySelectorAll<HTMLInputElement>('app-review-panel input'))
      box.click();
    await page.whenStable();
    expect(button('Approve').disabled).toBe(false);
  });

  it('warns who opens another’s draft that changing it rules out checking it', async () => {
    await open(assessmentOf());
    expect(text()).toContain('Whoever saves a change in it cannot check it later.');
    TestBed.resetTestingModule();
    await open(assessmentOf({ authorId: sessionOf('engineer').user.id }));
    expect(text()).not.toContain('cannot check it later');
  });

  it('offers no check of one’s own work, and nothing to other roles', async () => {
    const own = sessionOf('engineer').user.id;
    await open(assessmentOf({ state: 'submitted', editorIds: [own] }));
    expect(root().querySelector('app-review-panel')).toBeNull();
    expect(text()).toContain('somebody else has to check it');
    TestBed.resetTestingModule();
    await open(assessmentOf(), 'planner');
    expect(text()).not.toContain('Save draft');
    expect(root().querySelector('#conclusion')).toBeNull();
  });

  it('shows what somebody else saved meanwhile, and keeps what was typed', async () => {
    await open(assessmentOf());
    type('conclusion', 'Mine.');
    button('Save draft').click();
    const current = assessmentOf({ conclusion: 'Theirs.', version: 4 });
    server
      .expectOne(({ method }) => method === 'PATCH')
      .flush({ title: 'Changed', current }, { status: 412, statusText: 'stale' });
    await page.whenStable();
    expect(root().querySelector('app-changed-meanwhile')?.textContent).toContain('Theirs.');
    button('Save mine over it').click();
    const { request } = server.expectOne(({ method }) => method === 'PATCH');
    expect(request.headers.get('If-Match')).toBe('"4"');
    expect(request.body).toMatchObject({ conclusion: 'Mine.' });
  });
});
