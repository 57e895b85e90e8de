import { FormBuilder } from '@angular/forms';
import { DEFAULT_SITE_RULES, siteRules } from '@ligament/domain/contract/site-rules';
import { daysOf, leadsProblem, rulesForm, rulesOf } from './rules-form';

describe('the form of the site rules', () => {
  const form = () => rulesForm(new FormBuilder().nonNullable, DEFAULT_SITE_RULES, '2026-12-01');

  it('holds the rules in force unchanged, and asks only for a reason', () => {
    const each = form();
    expect(rulesOf(each)).toEqual(DEFAULT_SITE_RULES);
    expect(each.valid).toBe(false);
    each.controls.reason.setValue('Procedure revision 7');
    expect(each.valid).toBe(true);
    expect(siteRules.safeParse(rulesOf(each)).success).toBe(true);
  });

  it('refuses a value out of bounds at its field', () => {
    const each = form();
    each.controls.heightAllowanceMmByTechnique.controls['PAUT']?.setValue(11);
    each.controls.maximumMonthsByMechanism.controls['fatigue']?.setValue(0);
    expect(each.controls.heightAllowanceMmByTechnique.valid).toBe(false);
    expect(each.controls.maximumMonthsByMechanism.valid).toBe(false);
    expect(each.controls.lengthAllowanceMmByTechnique.valid).toBe(true);
  });
});

describe('days before the due date', () => {
  it('may be typed with commas, spaces or semicolons', () => {
    expect(daysOf('180, 90;30 7')).toEqual([180, 90, 30, 7]);
  });

  it.each(['', '30, 90', '30, 30', 'soon', '1.5', '401', '-1'])('are refused: "%s"', (text) => {
    expect(leadsProblem(text)).not.toBeNull();
  });

  it('are taken from the longest to the shortest', () => {
    expect(leadsProblem('180 90 30 0')).toBeNull();
  });
});
