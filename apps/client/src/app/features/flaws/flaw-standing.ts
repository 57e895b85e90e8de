import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { FlawView } from '@ligament/domain/contract/flaws';
import { AssessedDrawings } from '../../shared/assessed/assessed-drawings';
import { figuresOf } from '../../shared/assessed/figures-of';
import { weakInputs } from '../../shared/assessed/input-names';
import type { LifeSurroundings } from '../../shared/assessed/life-of';
import { RefusalNotice } from '../../shared/assessed/refusal-notice';
import { verdictSentence } from '../../shared/assessed/verdict-words';
import { Caution } from '../../shared/caution/caution';
import type { NamedSpan } from '../../shared/drawings/life-drawing';
import { FigureStrip } from '../../shared/figure-strip/figure-strip';
import { DayPipe, DaysPipe } from '../../shared/format/day-pipe';
import { basisOf, caseOf, type ShownAssessment } from './shown-assessment';

/** The answer above the fold: acceptable or not, until when, why; and how sure that answer is. */
@Component({
  selector: 'app-flaw-standing',
  imports: [RouterLink, FigureStrip, AssessedDrawings, RefusalNotice, Caution, DayPipe, DaysPipe],
  templateUrl: './flaw-standing.html',
  styleUrl: './flaw-standing.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FlawStanding {
  readonly flaw = input.required<FlawView>();
  readonly shown = input.required<ShownAssessment>();
  readonly windows = input.required<readonly NamedSpan[]>();
  readonly today = input.required<string>();

  protected readonly assessed = computed(() => caseOf(this.flaw(), this.shown()));
  protected readonly refused = computed(() => {
    const { outcome } = this.shown();
    return outcome.status === 'refused' ? outcome : null;
  });
  protected readonly figures = computed(() => {
    const each = this.assessed();
    return each ? figuresOf(each) : [];
  });
  /** Only what is signed gives a date. */
  protected readonly sentence = computed(() => {
    const each = this.assessed();
    if (!each) return '';
    return this.shown().standing === 'approved'
      ? verdictSentence(each.outcome.verdict, each.dueOn)
      : `Not signed yet: ${each.outcome.verdict} as computed.`;
  });
  protected readonly tone = computed(() => {
    const verdict = this.assessed()?.outcome.verdict;
    if (this.shown().standing !== 'approved' && verdict !== 'not acceptable') return 'unsigned';
    return verdict === 'not acceptable' ? 'bad' : verdict === 'near the limit' ? 'warn' : 'good';
  });
  protected readonly weak = computed(() => {
    const each = this.assessed();
    return each ? weakInputs(each.input, each.outcome.assumed) : { assumed: [], defaults: [] };
  });
  protected readonly proposal = computed(() => {
    const { proposal } = this.shown();
    return proposal?.status === 'proposed' ? proposal : null;
  });
  /** A finding that came after the one that was assessed. */
  protected readonly newer = computed(() => {
    const last = this.flaw().findings.at(-1);
    return last && last.id !== this.shown().findingId ? last : null;
  });
  protected readonly around = computed((): LifeSurroundings => {
    return {
      measured: this.flaw().findings.map((finding) => ({
        on: finding.inspectedOn,
        heightMm: finding.heightMm,
        errorMm: finding.heightErrorMm,
        label: `report ${finding.reportNo}, ${finding.technique}`,
      })),
      windows: this.windows(),
      basis: basisOf(this.shown()),
      today: this.today(),
    };
  });
}
