import type { Stage } from './stage';

/** A course of acts; before each it yields the day it waits for. */
export type Flow = AsyncGenerator<string, void, void>;

/** Plays courses beside each other, always the one whose next day is the earliest, so that the history stands in the order of time. */
export async function play(stage: Stage, flows: readonly Flow[]): Promise<void> {
  const waiting: { flow: Flow; day: string }[] = [];
  for (const flow of flows) await advance(flow, waiting);
  let today = '';
  while (waiting.length > 0) {
    const next = waiting.reduce((first, each) => (each.day < first.day ? each : first));
    waiting.splice(waiting.indexOf(next), 1);
    today = next.day > today ? next.day : today;
    stage.goTo(today);
    await advance(next.flow, waiting);
  }
}

async function advance(flow: Flow, waiting: { flow: Flow; day: string }[]): Promise<void> {
  const step = await flow.next();
  if (!step.done) waiting.push({ flow, day: step.value });
}
