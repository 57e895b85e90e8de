import type { FormGroup } from '@angular/forms';

/** Puts the messages of a refused request beside the fields they are about; what was typed stays. */
export function showProblemOnForm(
  form: FormGroup,
  problem: { readonly errors: readonly { readonly field: string; readonly message: string }[] },
): void {
  for (const { field, message } of problem.errors) {
    const control = form.get(field);
    control?.setErrors({ server: message });
    control?.markAsTouched();
  }
}
