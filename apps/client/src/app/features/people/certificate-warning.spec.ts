import { certificateWarning } from './certificate-warning';

describe('a certificate', () => {
  it.each([
    [null, ''],
    ['2026-11-30', 'expired'],
    ['2026-12-01', 'expires soon'],
    ['2027-01-30', 'expires soon'],
    ['2027-01-31', ''],
  ])('valid until %s on 1 December 2026: "%s"', (validUntil, words) => {
    expect(certificateWarning(validUntil, '2026-12-01')).toBe(words);
  });
});
