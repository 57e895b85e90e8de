import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { ROLES } from '@ligament/domain/contract/policy';
import { startWith, switchMap } from 'rxjs';
import { FieldError } from '../../shared/validation/field-error';
import type { PersonForm } from './person-form';
import { ROLE_WORDS } from './role-words';

/** The fields of a person; the page around them decides what is done with them. */
@Component({
  selector: 'app-person-fields',
  imports: [ReactiveFormsModule, FieldError],
  templateUrl: './person-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PersonFields {
  readonly form = input.required<PersonForm>();
  protected readonly roles = ROLES;
  private readonly role = toSignal(
    toObservable(this.form).pipe(
      switchMap(({ controls }) => controls.role.valueChanges.pipe(startWith(controls.role.value))),
    ),
    { initialValue: '' },
  );
  protected readonly roleWords = computed(() => {
    const role = this.role();
    return role ? ROLE_WORDS[role] : '';
  });
}
