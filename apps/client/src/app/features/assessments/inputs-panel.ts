import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { GrowthLawView } from '@ligament/domain/contract/growth-laws';
import type { Given } from '@ligament/domain/units/provenance';
import { inputName } from '../../shared/assessed/input-names';
import { choose, emptyProfile, given, include, setAt, valueAt } from './edit-input';
import { GivenField } from './given-field';
import { GrowthFields } from './growth-fields';
import { FactorFields } from './factor-fields';
import { SolutionChoice } from './solution-choice';
import { ProfileField } from './profile-field';
import { TOUGHNESS_PATH, toughnessKnown } from './toughness-known';
import { ToughnessButton } from './toughness-button';
import { type InputField, inputGroups, type Option } from './input-groups';

/** Every input of an assessment, in groups, each with its origin; to edit or to read. */
@Component({
  selector: 'app-inputs-panel',
  imports: [GivenField, GrowthFields, ProfileField, SolutionChoice, FactorFields, ToughnessButton],
  templateUrl: './inputs-panel.html',
  styleUrl: './inputs-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InputsPanel {
  readonly input = input.required<AssessmentInput>();
  readonly register = input<AssessmentInput | null>(null);
  readonly laws = input<readonly GrowthLawView[]>([]);
  readonly readOnly = input(false);
  /** What is wrong, by the path of the input. */
  readonly messages = input<ReadonlyMap<string, string>>(new Map());
  readonly changed = output<AssessmentInput>();

  protected readonly groups = computed(() => inputGroups(this.input()));
  protected readonly toughnessPath = TOUGHNESS_PATH;
  protected readonly known = computed(() => toughnessKnown(this.input()));
  protected readonly name = (path: string) => inputName(path).name;

  protected givenAt(path: string): Given | null {
    return given(valueAt(this.input(), path));
  }

  protected profileAt(path: string): Given<readonly number[]> | null {
    const value = given(valueAt(this.input(), path)) as Given<unknown> | null;
    return value && Array.isArray(value.value) ? (value as Given<readonly number[]>) : null;
  }

  protected setProfile(path: string, included: boolean): void {
    this.set(path, included ? emptyProfile() : null);
  }

  protected registerAt(path: string): Given | null {
    const register = this.register();
    return register ? given(valueAt(register, path)) : null;
  }

  protected wordAt(path: string): string {
    return String(valueAt(this.input(), path));
  }

  protected wordsOf({ path }: InputField, options: readonly Option[]): string {
    const word = this.wordAt(path);
    return options.find(({ value }) => value === word)?.words ?? word;
  }

  protected isOn(path: string): boolean {
    return valueAt(this.input(), path) === true;
  }

  protected set(path: string, value: unknown): void {
    this.changed.emit(setAt(this.input(), path, value));
  }

  protected choose(path: string, word: string): void {
    this.changed.emit(choose(this.input(), path, word, this.register()));
  }

  protected include(path: string, included: boolean): void {
    this.changed.emit(include(this.input(), path, included, this.register()));
  }
}
