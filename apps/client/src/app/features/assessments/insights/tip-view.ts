import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  type ElementRef,
  input,
  signal,
  viewChild,
} from '@angular/core';
import { tipState } from '@ligament/domain/assessment/analyses/tip-state';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { MapComponent } from '@ligament/domain/fracture/tip-field/map-request';
import { Drawing } from '../../../shared/drawing/drawing';
import { numberText } from '../../../shared/quantity/quantity-text';
import { scalePixels } from './map-colours';
import { COLUMNS, COMPONENTS, ROWS, tipPixels, tipTable } from './tip-map';

/** Steps of the drawn scale. */
const BAR = 90;
const ZOOMS = { min: 0.25, max: 4, step: 0.05 } as const;

/** The elastic stress around the governing tip, the zone that yields, and whether K alone may judge the flaw. */
@Component({
  selector: 'app-tip-view',
  imports: [Drawing],
  templateUrl: './tip-view.html',
  styleUrl: './tip-view.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TipView {
  readonly input = input.required<AssessmentInput>();

  protected readonly columns = COLUMNS;
  protected readonly rows = ROWS;
  protected readonly components = COMPONENTS;
  protected readonly zooms = ZOOMS;
  protected readonly numberText = numberText;
  protected readonly component = signal<MapComponent>('von Mises');
  protected readonly zoom = signal(1);
  protected readonly result = computed(() => tipState(this.input()));
  protected readonly tip = computed(() => {
    const result = this.result();
    return result.status === 'found' ? result : null;
  });
  protected readonly reach = computed(() => (this.tip()?.reachMm ?? 0) / this.zoom());
  protected readonly table = computed(() => {
    const tip = this.tip();
    return tip ? tipTable(tip, this.reach()) : { columns: [], rows: [] };
  });
  protected readonly label = computed(() => {
    const tip = this.tip();
    if (!tip) return '';
    const { planeStress, planeStrain } = tip.elasticUse.plasticRadiusMm;
    const radius = tip.condition === 'plane strain' ? planeStrain : planeStress;
    return `Stress around the crack tip at φ = ${tip.angleDeg}°, ${numberText(2 * this.reach(), 2)} mm wide; a line marks where the material would yield, about ${numberText(2 * radius, 2)} mm ahead of the tip.`;
  });
  private readonly canvas = viewChild<ElementRef<HTMLCanvasElement>>('canvas');
  private readonly bar = viewChild<ElementRef<HTMLCanvasElement>>('bar');

  constructor() {
    effect(() => {
      const [tip, canvas] = [this.tip(), this.canvas()?.nativeElement];
      if (!tip || !canvas) return;
      const pixels = tipPixels(tip, this.component(), this.reach());
      canvas.getContext('2d')?.putImageData(new ImageData(pixels, COLUMNS, ROWS), 0, 0);
    });
    effect(() => {
      const bar = this.bar()?.nativeElement;
      const pixels = scalePixels(BAR);
      bar?.getContext('2d')?.putImageData(new ImageData(pixels, BAR, 1), 0, 0);
    });
  }

  protected choose(word: string): void {
    const chosen = COMPONENTS.find(({ key }) => key === word);
    if (chosen) this.component.set(chosen.key);
  }
}
