import { jest } from '@jest/globals';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import type { Type } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { ActivatedRoute, provideRouter, Router } from '@angular/router';
import { problemInterceptor } from '../../core/http/problem-interceptor';
import { Session } from '../../core/session/session';
import { sessionOf } from '../../testing/session-of';
import { AcceptInvitation } from './accept-invitation';
import { RequestReset } from './request-reset';
import { SetPassword } from './set-password';
import { SetUp } from './set-up';
import { SignIn } from './sign-in';

const TOKEN = 'one-time-token-of-thirty-letters';
const PASSWORD = 'the tide comes in at seven';

describe('the pages before the sign-in', () => {
  let fixture: ComponentFixture<unknown>;
  let page: HTMLElement;
  let server: HttpTestingController;
  let gone: string[];

  async function open(
    part: Type<unknown>,
    inputs: Readonly<Record<string, string>> = {},
    fragment = '',
  ) {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problemInterceptor])),
        provideHttpClientTesting(),
        provideRouter([]),
        { provide: ActivatedRoute, useValue: { snapshot: { fragment } } },
      ],
    });
    server = TestBed.inject(HttpTestingController);
    gone = [];
    jest.spyOn(TestBed.inject(Router), 'navigateByUrl').mockImplementation((url) => {
      gone.push(String(url));
      return Promise.resolve(true);
    });
    fixture = TestBed.createComponent(part);
    Object.entries(inputs).forEach(([name, value]) => fixture.componentRef.setInput(name, value));
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  }

  function type(values: Readonly<Record<string, string>>): void {
    for (const [id, value] of Object.entries(values)) {
      const field = page.querySelector<HTMLInputElement>(`#${id}`);
      if (!field) throw new Error(`no field ${id}`);
      field.value = value;
      field.dispatchEvent(new Event('input'));
    }
  }

  async function send(): Promise<void> {
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    await fixture.whenStable();
  }

  const alerts = () =>
    [...page.querySelectorAll('[role=alert]')].map((each) =>
      each.textContent?.replace(/\s+/g, ' ').trim(),
    );
  const refuse = { status: 401, statusText: 'x' };

  describe('sign-in', () => {
    it('goes to where the person was going', async () => {
      await open(SignIn, { next: '/flaws/7?tab=growth' });
      type({ email: 'ada.quill@saltmere.example', password: PASSWORD });
      await send();
      server.expectOne('/api/session').flush(sessionOf('engineer'));
      expect(gone).toEqual(['/flaws/7?tab=growth']);
    });

    it.each(['//evil.example', 'https://evil.example', '/sign-in?next=/sign-in'])(
      'never follows %s',
      async (next) => {
        await open(SignIn, { next });
        type({ email: 'ada.quill@saltmere.example', password: PASSWORD });
        await send();
        server.expectOne('/api/session').flush(sessionOf('engineer'));
        expect(gone).toEqual(['/today']);
      },
    );

    it('says what is missing without asking the server', async () => {
      await open(SignIn);
      await send();
      expect(alerts()[0]).toContain('Give your e-mail address and your password.');
      server.expectNone('/api/session');
    });

    it('shows the server’s words, keeps what was typed and can be tried again', async () => {
      await open(SignIn);
      type({ email: 'ada.quill@saltmere.example', password: 'wrong' });
      await send();
      const detail = 'The e-mail address or the password is not right.';
      server.expectOne('/api/session').flush({ title: 'Not signed in', detail }, refuse);
      await fixture.whenStable();
      expect(alerts()).toEqual([`Not signed in. ${detail}`]);
      expect(page.querySelector<HTMLInputElement>('#email')?.value).toContain('ada.quill');
      expect(page.querySelector<HTMLButtonElement>('button[type=submit]')?.disabled).toBe(false);
    });

    it('shows the password on request', async () => {
      await open(SignIn);
      page.querySelector<HTMLInputElement>('input[type=checkbox]')?.click();
      await fixture.whenStable();
      expect(page.querySelector<HTMLInputElement>('#password')?.type).toBe('text');
    });
  });

  describe('an invitation', () => {
    it('is accepted with a name and a long password', async () => {
      await open(AcceptInvitation, { token: TOKEN });
      type({ name: 'Ada Quill', 'new-password': PASSWORD });
      await send();
      const sent = server.expectOne(`/api/invitations/${TOKEN}/accept`);
      expect(sent.request.body).toEqual({ name: 'Ada Quill', password: PASSWORD });
      sent.flush(sessionOf('inspector'));
      expect(TestBed.inject(Session).user()?.role).toBe('inspector');
      expect(gone).toEqual(['/today']);
    });

    it('needs a name, and a password that is long enough', async () => {
      await open(AcceptInvitation, { token: TOKEN });
      type({ 'new-password': 'short' });
      await send();
      expect(alerts()).toContain('Use at least 15 characters; a sentence is fine.');
      type({ 'new-password': PASSWORD });
      await send();
      expect(alerts()).toEqual(['Fill this in.']);
      server.expectNone(() => true);
    });

    it('says when it has run out', async () => {
      await open(AcceptInvitation, { token: TOKEN });
      type({ name: 'Ada Quill', 'new-password': PASSWORD });
      await send();
      server
        .expectOne(() => true)
        .flush(
          { title: 'Too late', detail: 'Ask for a new one.' },
          { status: 410, statusText: 'x' },
        );
      await fixture.whenStable();
      expect(alerts()).toEqual(['Too late. Ask for a new one.']);
    });
  });

  describe('a forgotten password', () => {
    it('is answered in the server’s words, the same for every address', async () => {
      await open(RequestReset);
      type({ email: 'Ada.Quill@Saltmere.example' });
      await send();
      const detail = 'If the address is known, a link is on its way.';
      server.expectOne('/api/password-resets').flush({ detail });
      await fixture.whenStable();
      expect(page.querySelector('[role=status]')?.textContent).toBe(detail);
    });

    it('needs an e-mail address', async () => {
      await open(RequestReset);
      type({ email: 'ada' });
      await send();
      expect(alerts()).toEqual(['Give an e-mail address such as name@example.org.']);
      server.expectNone(() => true);
    });

    it('is set anew with the link of the e-mail', async () => {
      await open(SetPassword, { token: TOKEN });
      type({ 'new-password': PASSWORD });
      await send();
      const sent = server.expectOne(`/api/password-resets/${TOKEN}`);
      expect(sent.request.body).toEqual({ password: PASSWORD });
      sent.flush(null);
      await fixture.whenStable();
      expect(page.querySelector('[role=status]')?.textContent).toContain('The password is set');
    });
  });

  describe('setting up', () => {
    it('explains itself without the one-time link', async () => {
      await open(SetUp);
      expect(page.textContent).toContain('Open the one-time link');
      expect(page.querySelector('form')).toBeNull();
    });

    it('creates the site and its first administrator', async () => {
      await open(SetUp, {}, TOKEN);
      type({
        siteName: 'Saltmere Works',
        siteCode: 'SAL',
        name: 'Ada Quill',
        email: 'ada.quill@saltmere.example',
        'new-password': PASSWORD,
      });
      await send();
      const sent = server.expectOne('/api/setup');
      expect(sent.request.body).toMatchObject({
        token: TOKEN,
        siteCode: 'SAL',
        password: PASSWORD,
      });
      sent.flush(sessionOf('administrator'));
      expect(gone).toEqual(['/today']);
    });

    it('shows the server’s message beside the field it is about', async () => {
      await open(SetUp, {}, TOKEN);
      type({
        siteName: 'Saltmere Works',
        siteCode: 'SAL',
        name: 'Ada Quill',
        email: 'ada.quill@saltmere.example',
        'new-password': PASSWORD,
      });
      await send();
      const errors = [{ field: 'siteCode', message: 'Letters and digits only.' }];
      server
        .expectOne('/api/setup')
        .flush(
          { title: 'Check these', detail: 'See below.', errors },
          { status: 422, statusText: 'x' },
        );
      await fixture.whenStable();
      expect(alerts()).toEqual(['Check these. See below.', 'Letters and digits only.']);
    });
  });
});
