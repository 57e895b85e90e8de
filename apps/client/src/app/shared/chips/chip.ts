import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

type Tone = 'good' | 'warn' | 'bad' | 'plain' | 'steel';

/** Tone and shape of every state word; the shape says the same as the colour. */
const LOOK: Readonly<Record<string, readonly [Tone, string]>> = {
  acceptable: ['good', '●'],
  'near the limit': ['warn', '▲'],
  'not acceptable': ['bad', '■'],
  'cannot tell': ['plain', '◇'],
  refused: ['plain', '◇'],
  'not assessed': ['plain', '○'],
  draft: ['plain', '○'],
  submitted: ['steel', '◐'],
  returned: ['warn', '▲'],
  approved: ['good', '●'],
  superseded: ['plain', '–'],
  overdue: ['bad', '■'],
  'due soon': ['warn', '▲'],
  later: ['good', '●'],
  open: ['plain', '○'],
  planned: ['steel', '◐'],
  confirmed: ['good', '●'],
  'in execution': ['steel', '◐'],
  'awaiting report': ['warn', '▲'],
  done: ['good', '●'],
  cancelled: ['plain', '–'],
  'in progress': ['steel', '◐'],
  accepted: ['good', '●'],
  rejected: ['bad', '■'],
  void: ['plain', '–'],
  new: ['warn', '▲'],
  'under assessment': ['steel', '◐'],
  'accepted with conditions': ['good', '●'],
  referred: ['warn', '▲'],
  removed: ['plain', '–'],
  closed: ['plain', '–'],
  'in service': ['good', '●'],
  'out of service': ['bad', '■'],
  retired: ['plain', '–'],
  sent: ['good', '●'],
  queued: ['plain', '○'],
  'not delivered': ['bad', '■'],
  stop: ['bad', '■'],
  hold: ['warn', '▲'],
  check: ['steel', '◆'],
  note: ['plain', '○'],
};

/** A state as a word with a shape and, last, a colour. */
@Component({
  selector: 'app-chip',
  template: `<span aria-hidden="true">{{ shape() }}</span> {{ label() ?? word() }}`,
  styles: `
    :host {
      display: inline-flex;
      gap: 6px;
      align-items: center;
      padding: 1px 8px;
      border-radius: var(--radius);
      font-size: 12px;
      font-weight: 500;
      white-space: nowrap;
      background: var(--sheet-2);
      color: var(--ink-2);
    }
    :host(.good) {
      background: var(--good-soft);
      color: var(--good);
    }
    :host(.warn) {
      background: var(--warn-soft);
      color: var(--warn);
    }
    :host(.bad) {
      background: var(--bad-soft);
      color: var(--bad);
    }
    :host(.steel) {
      background: var(--steel-soft);
      color: var(--ink);
    }
    span {
      font-size: 10px;
    }
  `,
  host: { '[class]': 'tone()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Chip {
  /** A word of the shared vocabulary; gives shape and colour. */
  readonly word = input.required<string>();
  /** Words to show instead, e.g. "Acceptable, monitor". */
  readonly label = input<string>();
  protected readonly tone = computed(() => LOOK[this.word()]?.[0] ?? 'plain');
  protected readonly shape = computed(() => LOOK[this.word()]?.[1] ?? '○');
}
