import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute } from '@angular/router';
import { ENGINE_VERSION } from '@ligament/domain/assessment/engine-version';
import { type CheckResult } from '@ligament/domain/verification/check-row';
import { evaluateChecks } from '@ligament/domain/verification/checks';
import { Chip } from '../../shared/chips/chip';
import { saveText } from '../../shared/files/save-text';
import { PageHeader } from '../../shared/page-header/page-header';
import { csvText } from '../../shared/table/csv-text';
import { ListQuery } from '../../shared/table/list-query';

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
  protected readonly results = evaluateChecks();
  protected readonly met = this.results.filter(({ met }) => met).length;
  protected readonly groups = [...new Set(this.results.map(({ group }) => group))];
  protected readonly rows = computed(() =>
    this.results.filter(
      (row) =>
        (!this.group() || row.group === this.group()) && (this.show() !== 'failed' || !row.met),
    ),
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
    const rows = this.rows().map((row) => [
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
