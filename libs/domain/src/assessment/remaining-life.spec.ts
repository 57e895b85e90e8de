import type { GrowthHistory } from './follow-growth';
import { NO_LIFE, remainingLife } from './remaining-life';

const history = (over: Partial<GrowthHistory> = {}): GrowthHistory => ({
  path: [],
  events: [],
  years: 1.4399,
  end: 'limit reached',
  validityLimit: null,
  ...over,
});

describe('remainingLife', () => {
  it('rounds years and cycles down', () => {
    expect(remainingLife(history(), 4200)).toMatchObject({
      years: 1.43,
      cycles: 6047,
      end: 'limit reached',
    });
  });

  it('does not lose a hundredth to the rounding of the machine', () => {
    expect(remainingLife(history({ years: 29.999_999_999_9 }), 0).years).toBe(30);
  });

  it('says in words why it ends', () => {
    const words = (over: Partial<GrowthHistory>) => remainingLife(history(over), 1).because;
    expect(words({})).toMatch(/reaches the line .* after 1\.43 years/);
    expect(words({ end: 'outside validity', validityLimit: 'a/t ≤ 0.8' })).toMatch(
      /\(a\/t ≤ 0\.8\)/,
    );
    expect(words({ end: 'horizon', years: 25 })).toMatch(/whole time it was followed, 25 years/);
    expect(words({ end: 'no growth', years: 40 })).toMatch(/No part of the flaw grows/);
  });

  it('states no figure above 40 years in words', () => {
    for (const end of ['limit reached', 'outside validity', 'horizon'] as const) {
      const { because } = remainingLife(history({ end, years: 52.2 }), 1);
      expect(because).toMatch(/more than 40 years/);
      expect(because).not.toMatch(/52/);
    }
  });

  it('gives the time of the first change of category, rounded down', () => {
    const event = {
      years: 3.089,
      from: 'embedded',
      to: 'surface',
      heightBeforeMm: 10,
      heightAfterMm: 12,
      rule: 'rule',
    } as const;
    expect(remainingLife(history({ events: [event], years: 15 }), 1).firstEventYears).toBe(3.08);
    expect(remainingLife(history(), 1).firstEventYears).toBeNull();
  });

  it('does not exist for a flaw that is not acceptable', () => {
    expect(NO_LIFE).toMatchObject({
      years: null,
      cycles: null,
      end: 'already at limit',
      firstEventYears: null,
    });
  });
});
