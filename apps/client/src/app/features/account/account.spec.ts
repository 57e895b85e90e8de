import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { Session } from '../../core/session/session';
import { sessionOf } from '../../testing/session-of';
import { Account } from './account';

const entry = (id: string, current: boolean) => ({
  id,
  current,
  createdAt: '2026-12-01T08:00:00Z',
  lastSeenAt: '2026-12-01T09:12:00Z',
  userAgent: `browser ${id}`,
  address: '10.0.0.4',
});

describe('Account', () => {
  let fixture: ComponentFixture<Account>;
  let page: HTMLElement;
  let server: HttpTestingController;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
    });
    TestBed.inject(Session).remember(sessionOf('engineer'));
    server = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(Account);
    page = fixture.nativeElement as HTMLElement;
    server.expectOne('/api/sessions').flush({ rows: [entry('s1', true), entry('s2', false)] });
    await fixture.whenStable();
  });

  afterEach(() => server.verify());

  function type(values: Readonly<Record<string, string>>): void {
    for (const [id, value] of Object.entries(values)) {
      const field = page.querySelector<HTMLInputElement>(`#${id}`);
      if (!field) throw new Error(`no field ${id}`);
      field.value = value;
      field.dispatchEvent(new Event('input'));
    }
  }

  async function press(label: string): Promise<void> {
    [...page.querySelectorAll('button')]
      .find((each) => each.textContent?.trim() === label)
      ?.click();
    await fixture.whenStable();
  }

  it('lists one’s sessions in the site’s time, and ends another one', async () => {
    const rows = [...page.querySelectorAll('tbody tr')].map((row) => row.textContent ?? '');
    expect(rows[0]).toContain('1 Dec 2026, 09:12');
    expect(rows[0]).toContain('this one');
    await press('End');
    server.expectOne({ method: 'DELETE', url: '/api/sessions/s2' }).flush(null);
    server.expectOne('/api/sessions').flush({ rows: [entry('s1', true)] });
    await fixture.whenStable();
    expect(page.querySelectorAll('tbody tr')).toHaveLength(1);
  });

  it('changes the password and empties the form', async () => {
    type({ current: 'the tide comes in at six', next: 'the tide comes in at seven' });
    await press('Change the password');
    const sent = server.expectOne('/api/session/password');
    expect(sent.request.body).toEqual({
      current: 'the tide comes in at six',
      next: 'the tide comes in at seven',
    });
    sent.flush(null);
    server.expectOne('/api/sessions').flush({ rows: [entry('s1', true)] });
    await fixture.whenStable();
    expect(page.querySelector('[role=status]')?.textContent).toContain('The password is changed');
    expect(page.querySelector<HTMLInputElement>('#next')?.value).toBe('');
    expect(page.querySelectorAll('.field-error')).toHaveLength(0);
  });

  it('asks nothing of the server while a field is wrong', async () => {
    type({ current: 'the tide comes in at six', next: 'short' });
    await press('Change the password');
    expect(page.querySelector('.field-error')?.textContent).toContain('at least 15 characters');
  });

  it('keeps what was typed when the server refuses', async () => {
    type({ current: 'not this one', next: 'the tide comes in at seven' });
    await press('Change the password');
    server
      .expectOne('/api/session/password')
      .flush(
        { title: 'Not changed', detail: 'The present password is not right.' },
        { status: 422, statusText: 'x' },
      );
    await fixture.whenStable();
    expect(page.querySelector('.notice.bad')?.textContent).toContain('not right');
    expect(page.querySelector<HTMLInputElement>('#next')?.value).toBe('the tide comes in at seven');
  });
});
