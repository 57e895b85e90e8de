import { jest } from '@jest/globals';
import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { sessionOf } from '../../testing/session-of';
import { Session } from '../session/session';
import { type Problem } from './problem';
import { problemInterceptor } from './problem-interceptor';

describe('problemInterceptor', () => {
  let http: HttpClient;
  let server: HttpTestingController;
  let session: Session;

  beforeEach(() => {
    jest.useFakeTimers();
    TestBed.configureTestingModule({
      providers: [
        provideRouter([]),
        provideHttpClient(withInterceptors([problemInterceptor])),
        provideHttpClientTesting(),
      ],
    });
    http = TestBed.inject(HttpClient);
    server = TestBed.inject(HttpTestingController);
    session = TestBed.inject(Session);
  });

  afterEach(() => {
    server.verify();
    jest.useRealTimers();
  });

  const failed = (request: (client: HttpClient) => ReturnType<HttpClient['get']>) => {
    const problems: Problem[] = [];
    request(http).subscribe({ error: (error: Problem) => problems.push(error) });
    return problems;
  };

  it('marks every write as ours and leaves reads alone', () => {
    http.get('/api/units').subscribe();
    http.post('/api/units', {}).subscribe();
    http.delete('/api/units/1').subscribe();
    const marks = server
      .match(() => true)
      .map(({ request }) => request.headers.get('X-Requested-With'));
    expect(marks).toEqual([null, 'ligament', 'ligament']);
  });

  it('tries a read once more after a server error', () => {
    const answers: unknown[] = [];
    http.get('/api/units').subscribe((answer) => answers.push(answer));
    server.expectOne('/api/units').flush(null, { status: 503, statusText: 'Busy' });
    jest.advanceTimersByTime(700);
    server.expectOne('/api/units').flush({ rows: [] });
    expect(answers).toEqual([{ rows: [] }]);
  });

  it('gives up after the second server error', () => {
    const problems = failed((client) => client.get('/api/units'));
    for (let time = 0; time < 2; time++) {
      server.expectOne('/api/units').flush({ title: 'Busy' }, { status: 503, statusText: 'Busy' });
      jest.advanceTimersByTime(700);
    }
    expect(problems).toMatchObject([{ status: 503, title: 'Busy' }]);
  });

  it('never repeats a write, nor a read that was refused', () => {
    const written = failed((client) => client.post('/api/units', {}));
    server.expectOne('/api/units').flush(null, { status: 500, statusText: 'x' });
    const refused = failed((client) => client.get('/api/people'));
    server.expectOne('/api/people').flush(null, { status: 403, statusText: 'x' });
    jest.advanceTimersByTime(5000);
    expect([written.length, refused.length]).toEqual([1, 1]);
  });

  it('ends the session on 401 and remembers where the person was', () => {
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    session.remember(sessionOf('planner'));
    failed((client) => client.get('/api/today'));
    server.expectOne('/api/today').flush(null, { status: 401, statusText: 'x' });
    expect(session.user()).toBeNull();
    expect(navigate).toHaveBeenCalledWith(['/sign-in'], { queryParams: { next: '/' } });
  });

  it('keeps the session when the server is in trouble', () => {
    session.remember(sessionOf('planner'));
    failed((client) => client.post('/api/today', {}));
    server.expectOne('/api/today').flush(null, { status: 500, statusText: 'x' });
    expect(session.user()?.role).toBe('planner');
  });
});
