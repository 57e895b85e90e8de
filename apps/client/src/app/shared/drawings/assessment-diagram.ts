import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type DiagramDrawing, diagramGeometry } from './diagram-geometry';
import { hostWidth } from './host-width';

/** Failure assessment diagram: the line with its cut-off, the flaw now, its way as it grows, and where that ends. */
@Component({
  selector: 'app-assessment-diagram',
  templateUrl: './assessment-diagram.html',
  styleUrl: './assessment-diagram.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AssessmentDiagram {
  readonly drawing = input.required<DiagramDrawing>();

  private readonly width = hostWidth(420);
  protected readonly shape = computed(() => diagramGeometry(this.drawing(), this.width()));
  protected readonly label = computed(() => {
    const { now, outside, lrMax, limit } = this.drawing();
    const where = outside ? 'outside' : 'inside';
    const end = limit ? ` Growth leads to ${limit.label}.` : '';
    return `Failure assessment diagram: the point Kr ${now.kr.toFixed(3)}, Lr ${now.lr.toFixed(3)} lies ${where} the line, whose cut-off is Lr ${lrMax.toFixed(3)}.${end}`;
  });
}
