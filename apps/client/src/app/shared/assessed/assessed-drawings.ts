import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { Drawing } from '../drawing/drawing';
import { AssessmentDiagram } from '../drawings/assessment-diagram';
import { LifeLine } from '../drawings/life-line';
import { SectionView } from '../drawings/section-view';
import type { AssessedCase } from './assessed-case';
import { diagramOf, diagramTable, sectionTable } from './diagram-of';
import { lifeOf, type LifeSurroundings, lifeTable } from './life-of';
import { sectionOf } from './section-of';

/** The three drawings of an assessed flaw: section view and diagram side by side, the life line below. */
@Component({
  selector: 'app-assessed-drawings',
  imports: [Drawing, SectionView, AssessmentDiagram, LifeLine],
  template: `
    <div class="pair">
      <app-drawing
        class="sheet"
        heading="Section view"
        [caption]="plane()"
        [table]="sectionTwin()"
        [name]="name() + '-section'"
      >
        <app-section-view [drawing]="section()" />
      </app-drawing>
      <app-drawing
        class="sheet"
        heading="Failure assessment diagram"
        [caption]="assessed().outcome.diagram ?? 'Option 1'"
        [table]="diagramTwin()"
        [name]="name() + '-diagram'"
      >
        <app-assessment-diagram [drawing]="diagram()" />
      </app-drawing>
    </div>
    <app-drawing
      class="sheet"
      heading="Life line"
      [caption]="lifeCaption()"
      [table]="lifeTwin()"
      [name]="name() + '-life'"
    >
      <app-life-line [drawing]="life()" />
    </app-drawing>
  `,
  styles: `
    :host {
      display: block;
      container-type: inline-size;
    }
    .pair {
      display: grid;
      gap: 16px;
      margin-bottom: 16px;
    }
    .pair > * {
      min-width: 0;
      margin: 0;
    }
    @container (min-width: 620px) {
      .pair {
        grid-template-columns: minmax(0, 1.2fr) minmax(0, 1fr);
      }
    }
    @container (min-width: 900px) {
      .pair {
        grid-template-columns: minmax(0, 1.75fr) minmax(0, 1fr);
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AssessedDrawings {
  readonly assessed = input.required<AssessedCase>();
  readonly around = input.required<LifeSurroundings>();
  /** Name of exported files. */
  readonly name = input('flaw');

  protected readonly section = computed(() => sectionOf(this.assessed()));
  protected readonly sectionTwin = computed(() => sectionTable(this.assessed()));
  protected readonly diagram = computed(() => diagramOf(this.assessed()));
  protected readonly diagramTwin = computed(() => diagramTable(this.assessed()));
  protected readonly life = computed(() => lifeOf(this.assessed(), this.around()));
  protected readonly lifeTwin = computed(() => lifeTable(this.life()));
  protected readonly plane = computed(() => {
    const { wall, flaw } = this.assessed().input;
    if (wall.shape !== 'cylinder') return 'crack plane, drawn to scale';
    return flaw.orientation === 'axial'
      ? 'crack plane along the shell’s axis, drawn to scale'
      : 'crack plane around the shell, unrolled, drawn to scale';
  });
  protected readonly lifeCaption = computed(() => {
    const { growth } = this.assessed().input;
    const laws = [
      growth.fatigue?.law.title,
      growth.stressCorrosion ? 'stress corrosion at a constant rate' : undefined,
    ].filter((law) => law !== undefined);
    const by = laws.length > 0 ? laws.join(' and ') : 'no growth given';
    return `measured ${this.life().quantity} with its error, growth predicted by ${by}, shutdown windows`;
  });
}
