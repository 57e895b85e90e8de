import type { NonNullableFormBuilder } from '@angular/forms';
import { siteRules, type SiteRules } from '@ligament/domain/contract/site-rules';
import { MECHANISMS, TECHNIQUES } from '@ligament/domain/contract/vocabulary';
import { isoDate, reason } from '@ligament/domain/contract/primitives';
import { fits } from '../../shared/validation/fits';

const { shape } = siteRules;

/** Numbers of a list typed with commas or spaces; what is no number becomes NaN, which the check refuses. */
export const daysOf = (text: string): number[] =>
  text
    .split(/[\s,;]+/)
    .filter((part) => part !== '')
    .map(Number);

/** The rules as a form, filled with those in force. */
export function rulesForm(builder: NonNullableFormBuilder, rules: SiteRules, today: string) {
  const record = <K extends string>(
    names: readonly K[],
    values: Readonly<Record<K, number>>,
    check: Parameters<typeof fits>[0],
  ) =>
    builder.record(
      Object.fromEntries(names.map((name) => [name, builder.control(values[name], fits(check))])),
    );
  return builder.group({
    lifeFraction: [rules.lifeFraction, fits(shape.lifeFraction)],
    codeMaximumMonths: [rules.codeMaximumMonths, fits(shape.codeMaximumMonths)],
    dueSoonDays: [rules.dueSoonDays, fits(shape.dueSoonDays)],
    reportingDays: [rules.reportingDays, fits(shape.reportingDays)],
    remindWhileOverdue: [rules.remindWhileOverdue],
    reminderLeadDays: [
      rules.reminderLeadDays.join(', '),
      (control: { value: unknown }) => leadsProblem(String(control.value)),
    ],
    maximumMonthsByMechanism: record(
      MECHANISMS,
      rules.maximumMonthsByMechanism,
      shape.codeMaximumMonths,
    ),
    heightAllowanceMmByTechnique: record(
      TECHNIQUES,
      rules.heightAllowanceMmByTechnique,
      shape.heightAllowanceMmByTechnique.valueType,
    ),
    lengthAllowanceMmByTechnique: record(
      TECHNIQUES,
      rules.lengthAllowanceMmByTechnique,
      shape.lengthAllowanceMmByTechnique.valueType,
    ),
    effectiveOn: [today, fits(isoDate)],
    reason: ['', fits(reason)],
  });
}

export type RulesForm = ReturnType<typeof rulesForm>;

/** The rules a form holds; valid only if the form is. */
export function rulesOf(form: RulesForm): SiteRules {
  const { effectiveOn: _day, reason: _reason, reminderLeadDays, ...rest } = form.getRawValue();
  return {
    ...rest,
    reminderLeadDays: daysOf(reminderLeadDays),
    maximumMonthsByMechanism:
      rest.maximumMonthsByMechanism as SiteRules['maximumMonthsByMechanism'],
    heightAllowanceMmByTechnique:
      rest.heightAllowanceMmByTechnique as SiteRules['heightAllowanceMmByTechnique'],
    lengthAllowanceMmByTechnique:
      rest.lengthAllowanceMmByTechnique as SiteRules['lengthAllowanceMmByTechnique'],
  };
}

/** What is wrong with the days before the due date; null when nothing is. */
export function leadsProblem(text: string): { fits: string } | null {
  const days = daysOf(text);
  if (!shape.reminderLeadDays.safeParse(days).success) {
    return { fits: 'Give whole days from 0 to 400, such as 180, 90, 30, 7.' };
  }
  const ordered = days.every((day, index) => index === 0 || day < (days[index - 1] ?? 0));
  return ordered ? null : { fits: 'List them from the longest to the shortest, each once.' };
}
