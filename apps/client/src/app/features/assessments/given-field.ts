import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  untracked,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { type Given, PROVENANCES } from '@ligament/domain/units/provenance';
import { inputName } from '../../shared/assessed/input-names';
import { ProvenanceMark } from '../../shared/provenance/provenance-mark';
import { numberText } from '../../shared/quantity/quantity-text';
import { isUnexplained } from './overrides';

/** One input with its unit, its origin and the note behind it; says what it overrides. */
@Component({
  selector: 'app-given-field',
  imports: [ReactiveFormsModule, ProvenanceMark],
  templateUrl: './given-field.html',
  styleUrl: './given-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class GivenField {
  readonly path = input.required<string>();
  readonly given = input.required<Given>();
  /** What register, finding or site list say now; null where they say nothing. */
  readonly register = input<Given | null>(null);
  readonly readOnly = input(false);
  /** What is wrong with it, or which limit it breaks. */
  readonly message = input<string>();
  readonly changed = output<Given>();

  protected readonly provenances = PROVENANCES;
  protected readonly name = computed(() => inputName(this.path()));
  protected readonly id = computed(() => `input-${this.path().replaceAll('.', '-')}`);
  protected readonly form = inject(NonNullableFormBuilder).group({
    value: new FormControl<number | null>(null),
    provenance: ['assumed' as Given['provenance']],
    note: [''],
  });
  protected readonly overrides = computed(() => {
    const known = this.register();
    return known !== null && known.value !== this.given().value ? known : null;
  });
  protected readonly unexplained = computed(() => isUnexplained(this.given(), this.register()));
  protected readonly text = computed(() => {
    const { value } = this.given();
    return Number.isFinite(value) ? numberText(value, 6) : '—';
  });

  constructor() {
    effect(() => {
      const { value, provenance, note } = this.given();
      untracked(() => this.show(value, provenance, note));
    });
    this.form.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => {
      const { value, provenance, note } = this.form.getRawValue();
      this.changed.emit({ value: value ?? Number.NaN, provenance, note });
    });
  }

  protected knownText({ value }: Given): string {
    return numberText(value, 6);
  }

  /** The field keeps what is being typed; only a change from elsewhere is written into it. */
  private show(value: number, provenance: Given['provenance'], note: string): void {
    const now = this.form.getRawValue();
    const shown = now.value ?? Number.NaN;
    if (Object.is(shown, value) && now.provenance === provenance && now.note === note) return;
    this.form.setValue(
      { value: Number.isFinite(value) ? value : null, provenance, note },
      { emitEvent: false },
    );
  }
}
