import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { hostWidth } from './host-width';
import { type Dimension, sectionGeometry } from './section-geometry';
import type { SectionDrawing } from './section-drawing';

let views = 0;
/** Half of the room the ligament's label takes on its line. */
const BOX_HALF = 62;

/** The wall drawn to scale with the flaw in it: now, at the next inspection, and at its limit. */
@Component({
  selector: 'app-section-view',
  templateUrl: './section-view.html',
  styleUrl: './section-view.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SectionView {
  readonly drawing = input.required<SectionDrawing>();

  private readonly width = hostWidth();
  protected readonly hatch = `hatch-${++views}`;
  protected readonly shape = computed(() => sectionGeometry(this.drawing(), this.width()));
  protected readonly label = computed(() => {
    const { wallMm, measured, assessed, expected, limiting } = this.drawing();
    const parts = [measured, assessed, expected, limiting].flatMap((each) => each?.label ?? []);
    return `Section through a wall of ${wallMm} mm, drawn to scale: ${parts.join('; ')}.`;
  });

  protected middle({ x1, x2 }: Dimension): number {
    return (x1 + x2) / 2;
  }

  /** The ligament's label stands on its line where it fits, else beside it. */
  protected readonly boxed = computed(() => {
    const { ligament } = this.shape();
    return ligament !== null && ligament.x1 > BOX_HALF && Math.abs(ligament.y2 - ligament.y1) >= 44;
  });
}
