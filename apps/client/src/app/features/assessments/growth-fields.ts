import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import type { CycleBlockInput, GrowthInput } from '@ligament/domain/assessment/assessment-input';
import type { GrowthLawView } from '@ligament/domain/contract/growth-laws';
import type { Given } from '@ligament/domain/units/provenance';
import { numberText } from '../../shared/quantity/quantity-text';
import { GivenField } from './given-field';

const NO_BLOCK: CycleBlockInput = {
  membraneRangeMPa: Number.NaN,
  bendingRangeMPa: 0,
  cyclesPerYear: Number.NaN,
  note: '',
};
const NO_RATE: Given = { value: Number.NaN, provenance: 'assumed', note: '' };

/** What makes the flaw grow: a fatigue law with the year's cycles, and stress corrosion at a constant rate. */
@Component({
  selector: 'app-growth-fields',
  imports: [MatButtonModule, GivenField],
  templateUrl: './growth-fields.html',
  styleUrl: './growth-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class GrowthFields {
  readonly growth = input.required<GrowthInput>();
  readonly register = input<GrowthInput | null>(null);
  readonly laws = input<readonly GrowthLawView[]>([]);
  readonly readOnly = input(false);
  readonly messages = input<ReadonlyMap<string, string>>(new Map());
  readonly changed = output<GrowthInput>();

  protected readonly numberText = numberText;
  /** The site's laws, and the draft's own where the site no longer has it. */
  protected readonly choices = computed(() => {
    const own = this.growth().fatigue?.law;
    const known = this.laws().map(lawOf);
    return own && !known.some(({ key }) => key === own.key) ? [own, ...known] : known;
  });
  protected readonly cyclesPerYear = computed(() =>
    (this.growth().fatigue?.blocks ?? []).reduce(
      (sum, { cyclesPerYear }) => sum + cyclesPerYear,
      0,
    ),
  );
  /** Messages about the blocks and the law, in order. */
  protected readonly blockMessages = computed(() =>
    [...this.messages()]
      .filter(([path]) => path.startsWith('growth.fatigue'))
      .map(([path, words]) => {
        const place = /blocks\.(\d+)/.exec(path)?.[1];
        return place === undefined ? words : `Block ${Number(place) + 1}: ${words}`;
      }),
  );

  protected setFatigue(on: boolean): void {
    const law = this.register()?.fatigue?.law ?? this.choices()[0];
    const blocks = this.register()?.fatigue?.blocks ?? [NO_BLOCK];
    this.emit({ fatigue: on && law ? { law, blocks } : null });
  }

  protected setLaw(key: string): void {
    const law = this.choices().find((each) => each.key === key);
    const { fatigue } = this.growth();
    if (law && fatigue) this.emit({ fatigue: { ...fatigue, law } });
  }

  protected setBlock(place: number, change: Partial<CycleBlockInput>): void {
    this.setBlocks((blocks) =>
      blocks.map((block, i) => (i === place ? { ...block, ...change } : block)),
    );
  }

  protected addBlock(): void {
    this.setBlocks((blocks) => [...blocks, NO_BLOCK]);
  }

  protected removeBlock(place: number): void {
    this.setBlocks((blocks) => blocks.filter((_, i) => i !== place));
  }

  protected setCorrosion(on: boolean): void {
    const known = this.register()?.stressCorrosion;
    this.emit({
      stressCorrosion: on
        ? (known ?? { depthRateMmPerYear: NO_RATE, endRateMmPerYear: NO_RATE })
        : null,
    });
  }

  protected setRate(which: 'depthRateMmPerYear' | 'endRateMmPerYear', rate: Given): void {
    const { stressCorrosion } = this.growth();
    if (stressCorrosion) this.emit({ stressCorrosion: { ...stressCorrosion, [which]: rate } });
  }

  private setBlocks(
    change: (blocks: readonly CycleBlockInput[]) => readonly CycleBlockInput[],
  ): void {
    const { fatigue } = this.growth();
    if (fatigue) this.emit({ fatigue: { ...fatigue, blocks: change(fatigue.blocks) } });
  }

  private emit(change: Partial<GrowthInput>): void {
    this.changed.emit({ ...this.growth(), ...change });
  }
}

const lawOf = ({ key, title, source, stages, thresholdMpaSqrtMm }: GrowthLawView) => ({
  key,
  title,
  source,
  stages,
  thresholdMPaSqrtMm: thresholdMpaSqrtMm,
});
