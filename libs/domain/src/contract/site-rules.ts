import * as z from 'zod';
import { between } from './primitives';
import { MECHANISMS, TECHNIQUES } from './vocabulary';

/** A whole number between two bounds. */
const whole = (low: number, high: number, unit: string) =>
  between(low, high, unit).int({ error: `Give a whole number of ${unit}.` });

const months = whole(1, 240, 'months');

/** The site's rules for intervals, allowances and reminders; versioned, and cited by every assessment made under them. */
export const siteRules = z.strictObject({
  /** Fraction of the remaining life after which the flaw is looked at again. */
  lifeFraction: between(0.1, 1, '(fraction of life)'),
  /** Longest interval whatever the remaining life [months]. */
  codeMaximumMonths: months,
  /** Longest interval by damage mechanism [months]. */
  maximumMonthsByMechanism: z.record(z.enum(MECHANISMS), months),
  /** Added to the measured size before assessment, by technique [mm]. */
  heightAllowanceMmByTechnique: z.record(z.enum(TECHNIQUES), between(0, 10, 'mm')),
  lengthAllowanceMmByTechnique: z.record(z.enum(TECHNIQUES), between(0, 50, 'mm')),
  /** Re-inspections due within this many days are "due soon". */
  dueSoonDays: whole(1, 730, 'days'),
  /** Days before the due date at which a reminder is sent, longest first. */
  reminderLeadDays: z
    .array(whole(0, 400, 'days'))
    .min(1)
    .max(20),
  /** Daily reminders go on while overdue. */
  remindWhileOverdue: z.boolean(),
  /** Working days for report and assessment between the inspection and the due date. */
  reportingDays: whole(0, 60, 'working days'),
});
export type SiteRules = z.infer<typeof siteRules>;

/** Rules a new site starts with: common practice, to be replaced by the owner's procedure. */
export const DEFAULT_SITE_RULES: SiteRules = {
  lifeFraction: 0.5,
  codeMaximumMonths: 120,
  maximumMonthsByMechanism: {
    fatigue: 24,
    'corrosion fatigue': 48,
    'thermal fatigue': 60,
    'stress corrosion cracking': 12,
    'fabrication, not growing': 60,
    'hydrogen attack': 12,
    creep: 12,
    unknown: 12,
  },
  heightAllowanceMmByTechnique: {
    UT: 1.5,
    PAUT: 1,
    TOFD: 0.8,
    'PAUT+TOFD': 0.8,
    TFM: 1,
    MT: 3,
    PT: 3,
    ET: 2,
    RT: 3,
    VT: 3,
    other: 3,
  },
  lengthAllowanceMmByTechnique: {
    UT: 3,
    PAUT: 2,
    TOFD: 1.6,
    'PAUT+TOFD': 1.6,
    TFM: 2,
    MT: 3,
    PT: 3,
    ET: 4,
    RT: 4,
    VT: 5,
    other: 5,
  },
  dueSoonDays: 180,
  reminderLeadDays: [180, 90, 60, 30, 14, 7, 1],
  remindWhileOverdue: true,
  reportingDays: 15,
};
