import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { Session } from '../../core/session/session';
import { sessionOf } from '../../testing/session-of';
import { ComponentList } from './component-list';

const ROW = {
  id: 'c1',
  tag: 'C-202',
  description: 'Amine regenerator',
  unitId: 'u1',
  unitCode: 'U200',
  kind: 'vessel shell',
  insideDiameterMm: 2000,
  wallMm: 14,
  designPressureMpa: 0.45,
  mechanism: 'fatigue',
  state: 'in service',
  flaws: 1,
  worstVerdict: 'acceptable',
  nextDueOn: '2026-11-12',
  urgency: 'overdue',
};

describe('ComponentList', () => {
  let server: HttpTestingController;
  let page: HTMLElement;
  let harness: RouterTestingHarness;

  async function open(url: string, role: 'engineer' | 'auditor' = 'engineer'): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter(
          [{ path: 'register', component: ComponentList }],
          withComponentInputBinding(),
        ),
      ],
    });
    TestBed.inject(Session).remember(sessionOf(role));
    server = TestBed.inject(HttpTestingController);
    harness = await RouterTestingHarness.create(url);
    await harness.fixture.whenStable();
    server
      .expectOne('/api/units')
      .flush({ rows: [{ id: 'u1', code: 'U200', name: 'Amine', components: 1, version: 1 }] });
    page = harness.routeNativeElement as HTMLElement;
  }

  async function answer(rows: readonly unknown[], nextCursor: string | null = null) {
    const asked = server.expectOne((request) => request.url === '/api/components');
    asked.flush({ rows, nextCursor });
    await harness.fixture.whenStable();
    return asked.request.params.toString();
  }

  it('asks for what the address says', async () => {
    await open('/register?search=C-2&kind=vessel%20shell&state=nonsense&sort=-due');
    expect(await answer([ROW])).toBe('search=C-2&kind=vessel%20shell&sort=-due');
  });

  it('shows each component with its units, verdict and due date', async () => {
    await open('/register');
    await answer([ROW]);
    const cells = [...page.querySelectorAll('tbody td')].map((cell) => cell.textContent?.trim());
    expect(cells.slice(0, 6)).toEqual([
      'C-202',
      'Amine regenerator',
      'U200',
      '2\u202f000\u202fmm',
      '14\u202fmm',
      '0.45\u202fMPa',
    ]);
    expect(page.querySelector('tbody')?.textContent).toContain('12 Nov 2026');
    expect(page.querySelector('tbody a')?.getAttribute('href')).toBe('/register/c1');
  });

  it('keeps a chosen filter in the address', async () => {
    await open('/register');
    await answer([ROW], 'next');
    const unit = page.querySelectorAll('select')[0];
    if (!unit) throw new Error('no filter');
    unit.value = 'u1';
    unit.dispatchEvent(new Event('change'));
    await harness.fixture.whenStable();
    expect(TestBed.inject(Router).url).toBe('/register?unit=u1');
    expect(await answer([])).toContain('unit=u1');
    expect(page.querySelector('app-empty')?.textContent).toContain('No component here');
  });

  it('offers a reader no way to add one', async () => {
    await open('/register', 'auditor');
    await answer([ROW]);
    expect(page.querySelector('app-page-header')?.textContent).not.toContain('Add a component');
    expect(page.querySelector('app-page-header')?.textContent).toContain('Export as CSV');
  });

  it('can try again after a failure', async () => {
    await open('/register');
    server
      .expectOne((request) => request.url === '/api/components')
      .flush({ title: 'Busy', detail: 'Try again.' }, { status: 503, statusText: 'x' });
    await harness.fixture.whenStable();
    expect(page.querySelector('[role=alert]')?.textContent).toContain('Busy');
    [...page.querySelectorAll('button')]
      .find((each) => each.textContent?.includes('Try again'))
      ?.click();
    await harness.fixture.whenStable();
    await answer([ROW]);
    expect(page.querySelectorAll('tbody tr')).toHaveLength(1);
  });
});
