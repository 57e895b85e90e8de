import { jest } from '@jest/globals';
import { TestBed } from '@angular/core/testing';
import { ErrorReporter } from './error-reporter';

describe('ErrorReporter', () => {
  it('keeps the last error to show it until it is dismissed', () => {
    const toConsole = jest.spyOn(console, 'error').mockImplementation(() => undefined);
    const reporter = TestBed.inject(ErrorReporter);
    reporter.handleError(new Error('The map could not be drawn'));
    expect(reporter.last()).toBe('The map could not be drawn');
    reporter.handleError('a word');
    expect(reporter.last()).toBe('a word');
    expect(toConsole).toHaveBeenCalledTimes(2);
    reporter.dismiss();
    expect(reporter.last()).toBeNull();
  });
});
