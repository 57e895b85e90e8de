import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  output,
  signal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import type { ComponentView, OperatingCycleView } from '@ligament/domain/contract/components';
import { switchMap } from 'rxjs';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Ask } from '../../shared/dialogs/ask';
import { DayPipe } from '../../shared/format/day-pipe';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { ProvenanceMark } from '../../shared/provenance/provenance-mark';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { PartEditor } from './part-editor';
import type { Part, PartKind } from './part-kinds';
import { RegisterClient } from './register-client';

interface Editing {
  readonly kind: PartKind;
  /** The record to change; null for a new one. */
  readonly part: Part | null;
}

const STRESSES = [
  { name: 'hoopMembraneMpa', label: 'Membrane, around' },
  { name: 'hoopBendingMpa', label: 'Bending, around' },
  { name: 'axialMembraneMpa', label: 'Membrane, along' },
  { name: 'axialBendingMpa', label: 'Bending, along' },
] as const;

/** Locations, load cases and operating cycles of a component, and their forms. */
@Component({
  selector: 'app-component-parts',
  imports: [MatButtonModule, PartEditor, ProblemNotice, ProvenanceMark, QuantityPipe, DayPipe],
  templateUrl: './component-parts.html',
  styles: ':host { display: block; min-width: 0; margin-top: 16px; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ComponentParts {
  readonly component = input.required<ComponentView>();
  /** Something was recorded; the component has to be read again. */
  readonly changed = output();
  private readonly client = inject(RegisterClient);
  private readonly ask = inject(Ask);
  protected readonly session = inject(Session);
  protected readonly stresses = STRESSES;
  protected readonly editing = signal<Editing | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly mayWrite = computed(() => this.session.can('register.write'));

  protected edit(kind: PartKind, part: Part | null): void {
    this.editing.set({ kind, part });
  }

  protected loadCaseName(id: string): string {
    return this.component().loadCases.find((each) => each.id === id)?.name ?? '—';
  }

  protected saved(): void {
    this.editing.set(null);
    this.changed.emit();
  }

  protected remove(cycle: OperatingCycleView): void {
    this.ask
      .reason({
        title: `Take out ${cycle.name}?`,
        text: 'Assessments already made keep the cycles they were computed with.',
        label: 'Reason',
        action: 'Take it out',
      })
      .pipe(switchMap(({ reason }) => this.client.removeCycle(cycle.id, cycle.version, reason)))
      .subscribe({
        next: () => this.saved(),
        error: (error: unknown) => this.problem.set(problemOf(error)),
      });
  }
}
