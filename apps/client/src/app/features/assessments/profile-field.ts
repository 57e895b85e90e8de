import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { type Given, PROVENANCES } from '@ligament/domain/units/provenance';
import { inputName } from '../../shared/assessed/input-names';
import { ProvenanceMark } from '../../shared/provenance/provenance-mark';
import { numberText } from '../../shared/quantity/quantity-text';

type Profile = Given<readonly number[]>;
const DEGREES = [0, 1, 2, 3, 4] as const;

/** A stress through the wall as a polynomial: one coefficient a degree, with the origin of them all. */
@Component({
  selector: 'app-profile-field',
  imports: [ProvenanceMark],
  templateUrl: './profile-field.html',
  styleUrl: './profile-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProfileField {
  readonly path = input.required<string>();
  readonly given = input.required<Profile>();
  readonly readOnly = input(false);
  /** What is wrong with it. */
  readonly message = input<string>();
  readonly changed = output<Profile>();

  protected readonly provenances = PROVENANCES;
  protected readonly degrees = DEGREES;
  protected readonly name = computed(() => inputName(this.path()).name);
  protected readonly text = computed(() =>
    this.given()
      .value.map((s, n) => `${numberText(s, 4)}${n === 0 ? '' : n === 1 ? ' x/t' : ` (x/t)^${n}`}`)
      .join(' + '),
  );

  protected coefficient(degree: number): number | '' {
    const value = this.given().value[degree];
    return value === undefined || Number.isNaN(value) ? '' : value;
  }

  protected setCoefficient(degree: number, typed: number): void {
    const { value } = this.given();
    const whole = DEGREES.map((n) => (n === degree ? typed : (value[n] ?? 0)));
    // what was never filled in above the highest degree stays out
    const last = whole.findLastIndex((each, n) => n === 0 || each !== 0);
    this.emit({ value: whole.slice(0, last + 1) });
  }

  protected setProvenance(word: string): void {
    const provenance = PROVENANCES.find((each) => each === word);
    if (provenance) this.emit({ provenance });
  }

  protected emit(change: Partial<Profile>): void {
    this.changed.emit({ ...this.given(), ...change });
  }
}
