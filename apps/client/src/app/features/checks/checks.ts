import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import { ENGINE_VERSION } from '@ligament/domain/assessment/engine-version';
import { type CheckResult } from '@ligament/domain/verification/check-row';
import { CHECK_ROWS } from '@ligament/domain/verification/checks';
import { Chip } from '../../shared/chips/chip';
import { saveText } from '../../shared/files/save-text';
import { PageHeader } from '../../shared/page-header/page-header';
import { csvText } from '../../shared/table/csv-text';
import { ListQuery } from '../../shared/table/list-query';
import { evaluateInTurns, GROUPS, summarise } from './evaluate-in-turns';

/** The engine against published values, computed here and now in this browser. */
@Component({
  selector: 'app-checks',
  imports: [MatButtonModule, Chip, PageHeader],
  templateUrl: './checks.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Checks {
  readonly group = input<string>();
  readonly show = input<string>();

  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  protected readonly engineVersion = ENGINE_VERSION;
  protected readonly total = CHECK_ROWS.length;
  protected readonly groups = GROUPS;
  protected readonly results = toSignal(evaluateInTurns(), { initialValue: [] });
  protected readonly met = computed(() => this.results().filter(({ met }) => met).length);
  protected readonly summaries = computed(() => summarise(this.results()));
  protected readonly chosen = computed(() => this.group() ?? GROUPS[0]);
  protected readonly failed = computed(() => this.show() === 'failed');
  /** Those of the chosen group; those outside their tolerance whatever their group. */
  protected readonly rows = computed(() =>
    this.results().filter((row) => (this.failed() ? !row.met : row.group === this.chosen())),
  );

  protected figure(value: number): string {
    return Number(value.toPrecision(6)).toString();
  }

  protected percent({ deviation, published }: CheckResult): string {
    return published === 0 ? this.figure(deviation) : `${(deviation * 100).toPrecision(2)} %`;
  }

  protected tolerance({ tolerance, published }: CheckResult): string {
    return published === 0 ? this.figure(tolerance) : `${(tolerance * 100).toPrecision(2)} %`;
  }

  protected share(worst: number): string {
    return `${(worst * 100).toPrecision(2)} %`;
  }

  protected set(change: Readonly<Record<string, string | null>>): void {
    this.listQuery.set(this.route, change);
  }

  protected save(): void {
    const header = [
      'group',
      'quantity',
      'published',
      'computed',
      'unit',
      'deviation',
      'tolerance',
      'met',
      'kind',
      'source',
    ];
    const rows = this.results().map((row) => [
      row.group,
      row.quantity,
      row.published,
      row.computed,
      row.unit,
      row.deviation,
      row.tolerance,
      String(row.met),
      row.kind,
      row.source,
    ]);
    saveText('checks.csv', 'text/csv;charset=utf-8', csvText(header, rows));
  }
}
