export type TurnKind = 'interactive' | 'batch';

/** How often batch work is passed over before it has its turn all the same. */
const PATIENCE = 200;

/** Lets one piece of work run at a time: what a person waits for first, batch work when nothing else waits. */
export class Turns {
  private busy = false;
  private passedOver = 0;
  private readonly waiting: Record<TurnKind, (() => void)[]> = { interactive: [], batch: [] };

  async take<T>(work: () => Promise<T>, kind: TurnKind = 'interactive'): Promise<T> {
    // the one who waits goes on in its own asynchronous context, not in that of whoever gave way
    if (this.busy) await new Promise<void>((resolve) => this.waiting[kind].push(resolve));
    else this.busy = true;
    try {
      return await work();
    } finally {
      this.passOn();
    }
  }

  private passOn(): void {
    const { interactive, batch } = this.waiting;
    const batchFirst = interactive.length === 0 || this.passedOver >= PATIENCE;
    const next = (batchFirst ? batch.shift() : undefined) ?? interactive.shift();
    this.passedOver = batchFirst || batch.length === 0 ? 0 : this.passedOver + 1;
    if (next) next();
    else this.busy = false;
  }
}
