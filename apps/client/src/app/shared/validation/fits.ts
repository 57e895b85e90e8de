import type { AbstractControl, ValidatorFn } from '@angular/forms';
import type { z } from 'zod';

/** A form validator that is the contract's own check; its message is the contract's. */
export function fits(schema: z.ZodType): ValidatorFn {
  return (control: AbstractControl) => {
    const read = schema.safeParse(control.value);
    return read.success ? null : { fits: read.error.issues[0]?.message ?? 'Check this value.' };
  };
}
