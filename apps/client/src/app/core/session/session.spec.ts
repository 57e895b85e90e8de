import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { ROLES } from '@ligament/domain/contract/policy';
import { sessionOf } from '../../testing/session-of';
import { Session } from './session';

describe('Session', () => {
  let session: Session;
  let server: HttpTestingController;

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting()],
    });
    session = TestBed.inject(Session);
    server = TestBed.inject(HttpTestingController);
  });

  afterEach(() => server.verify());

  it('asks the server once who is signed in', () => {
    session.load().subscribe();
    server.expectOne('/api/session').flush(sessionOf('engineer'));
    session.load().subscribe();
    expect(session.user()?.role).toBe('engineer');
    expect(session.site()?.name).toBe('Saltmere Works');
  });

  it('is nobody after a refusal, and does not ask again', () => {
    const seen: unknown[] = [];
    session.load().subscribe((view) => seen.push(view));
    server.expectOne('/api/session').flush(null, { status: 401, statusText: 'x' });
    session.load().subscribe((view) => seen.push(view));
    expect(seen).toEqual([null, null]);
    expect(session.user()).toBeNull();
  });

  it('signs in and out', () => {
    session.signIn('ada.quill@saltmere.example', 'the tide comes in at seven').subscribe();
    const sent = server.expectOne({ method: 'POST', url: '/api/session' });
    expect(sent.request.body).toEqual({
      email: 'ada.quill@saltmere.example',
      password: 'the tide comes in at seven',
    });
    sent.flush(sessionOf('planner'));
    expect(session.user()?.name).toBe('Ada Quill');
    session.signOut().subscribe();
    server.expectOne({ method: 'DELETE', url: '/api/session' }).flush(null);
    expect(session.user()).toBeNull();
    expect(session.site()).toBeNull();
  });

  it('gives the password again for a sign-off', () => {
    session.prove('the tide comes in at seven').subscribe();
    const { request } = server.expectOne('/api/session/proof');
    expect(request.body).toEqual({ password: 'the tide comes in at seven' });
  });

  it('lets nobody do anything before the sign-in', () => {
    expect(session.can('today.read')).toBe(false);
  });

  it.each(ROLES)('lets the %s do what the policy says', (role) => {
    session.remember(sessionOf(role));
    expect(session.can('flaws.read')).toBe(true);
    expect(session.can('people.write')).toBe(role === 'administrator');
    expect(session.can('assessments.write')).toBe(role === 'engineer');
  });
});
