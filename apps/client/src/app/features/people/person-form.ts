import type { FormGroup, NonNullableFormBuilder } from '@angular/forms';
import { personFacts } from '@ligament/domain/contract/people';
import type { Person, PersonChange } from '@ligament/domain/contract/people';
import type { Role } from '@ligament/domain/contract/policy';
import { isoDate } from '@ligament/domain/contract/primitives';
import * as z from 'zod';
import { fits } from '../../shared/validation/fits';

/** A date field may be left empty. */
const dayOrNothing = z.union([z.literal(''), isoDate], {
  error: 'Give a date, or leave it empty.',
});

/** Fields of a person as a form holds them: an empty date is an empty text. */
export function personForm(builder: NonNullableFormBuilder) {
  return builder.group({
    name: ['', fits(personFacts.name)],
    role: builder.control<Role | ''>('', fits(personFacts.role)),
    organisation: ['', fits(personFacts.organisation)],
    competence: ['', fits(personFacts.competence)],
    certificateNo: ['', fits(personFacts.certificateNo)],
    certificateValidUntil: ['', fits(dayOrNothing)],
    accessUntil: ['', fits(dayOrNothing)],
  });
}

export type PersonForm = ReturnType<typeof personForm>;

type Values = PersonForm extends FormGroup ? ReturnType<PersonForm['getRawValue']> : never;

/** A valid form's values as the server takes them. */
export function valuesOf({ role, certificateValidUntil, accessUntil, ...rest }: Values) {
  return {
    ...rest,
    // the form is not sent without a role
    role: role === '' ? ('auditor' as const) : role,
    certificateValidUntil: certificateValidUntil || null,
    accessUntil: accessUntil || null,
  } satisfies PersonChange;
}

/** A person's present values as the form shows them. */
export const shownOf = (person: Person): Values => ({
  name: person.name,
  role: person.role,
  organisation: person.organisation,
  competence: person.competence,
  certificateNo: person.certificateNo,
  certificateValidUntil: person.certificateValidUntil ?? '',
  accessUntil: person.accessUntil ?? '',
});
