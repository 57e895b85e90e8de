import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { hostWidth } from './host-width';
import type { LifeDrawing } from './life-drawing';
import { lifeGeometry } from './life-geometry';

/** One flaw on a time axis: what was measured, what is predicted, and by when somebody must look again. */
@Component({
  selector: 'app-life-line',
  templateUrl: './life-line.html',
  styleUrl: './life-line.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LifeLine {
  readonly drawing = input.required<LifeDrawing>();

  private readonly width = hostWidth(1000);
  protected readonly shape = computed(() => lifeGeometry(this.drawing(), this.width()));
  protected readonly label = computed(() => {
    const { measured, limit, due, quantity } = this.drawing();
    const last = measured.at(-1);
    const parts = [
      last ? `last measured ${quantity} ${last.heightMm} mm on ${last.on}` : '',
      due ? `${due.label}, ${due.basis}` : '',
      limit?.label ?? '',
    ].filter((part) => part !== '');
    return `Life line: ${parts.join('; ')}.`;
  });
}
