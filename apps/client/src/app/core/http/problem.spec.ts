import { HttpErrorResponse } from '@angular/common/http';
import { problemOf } from './problem';

const answer = (status: number, error: unknown) => new HttpErrorResponse({ status, error });

describe('problemOf', () => {
  it('reads problem details', () => {
    const problem = problemOf(
      answer(422, {
        type: 'urn:ligament:problem:invalid',
        title: 'Some values are not right',
        detail: 'See the fields.',
        errors: [{ field: 'depthMm', message: 'Must be above 0 mm.' }],
      }),
    );
    expect(problem).toMatchObject({ status: 422, code: 'invalid', detail: 'See the fields.' });
    expect(problem.errors).toEqual([{ field: 'depthMm', message: 'Must be above 0 mm.' }]);
  });

  it('keeps the current state of a record that was changed meanwhile', () => {
    expect(problemOf(answer(412, { title: 'Changed', current: { version: 3 } })).current).toEqual({
      version: 3,
    });
  });

  it('reads details that came as text', () => {
    const text = JSON.stringify({ title: 'Busy', detail: 'Try again in a few seconds.' });
    expect(problemOf(answer(503, text))).toMatchObject({ title: 'Busy', status: 503 });
  });

  it('has words for an answer that is not ours', () => {
    const problem = problemOf(answer(502, '<html>Bad gateway</html>'));
    expect(problem.title).toBe('The request failed');
    expect(problem.detail).not.toContain('<html>');
    expect(problem.errors).toEqual([]);
  });

  it('says that the server cannot be reached', () => {
    expect(problemOf(answer(0, new ProgressEvent('error')))).toMatchObject({
      title: 'No connection',
      code: 'offline',
    });
  });

  it('has words for an error of the page itself', () => {
    expect(problemOf(new TypeError('x is undefined'))).toMatchObject({ code: 'client', status: 0 });
    expect(problemOf(undefined).detail).not.toContain('undefined');
  });

  it('leaves a problem as it is', () => {
    const problem = problemOf(answer(404, { title: 'Not found' }));
    expect(problemOf(problem)).toBe(problem);
  });
});
