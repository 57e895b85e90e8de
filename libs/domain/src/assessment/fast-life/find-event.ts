import { evaluate } from './evaluate';
import {
  evaluations,
  highDeepest,
  highEnd,
  lnKDeepest,
  lnKEnd,
  lowDeepest,
  lowEnd,
  mostLnK,
  startRoom,
  startS,
  stepLength,
} from './lanes';
import type { LifeAccuracy } from './life-accuracy';
import { BRANCH, END_ABOVE, nearestEvent, roomLeft, sizeRoom } from './room-left';
import { layCurves, qAt } from './step-curve';
import { goTo } from './take-step';

/** A start that stands on an event already has this room, so that there is a crossing to look for. */
const LEAST_ROOM = 1e-12;
const ENOUGH = 1e-12;
const MOST_TRIALS = 30;

/** Stage whose slopes a trial may overwrite: the curve through the step does not ask for it. */
const SPARE = 1;

// bracket of the crossing, in shares of the step, with the room at its sides
let low = 0;
let lowRoom = 0;
let high = 1;
let highRoom = 0;

/** Which event was found last. */
export let eventFound = 0;

/**
 * The first event inside a step that has passed one, as a share of the step, by the curve through it; which event
 * it is stands in `eventFound`.
 */
export function findEvent(l: number, roomAtEnd: number, accuracy: LifeAccuracy): number {
  layCurves(l);
  const room = startRoom[l] as number;
  low = 0;
  lowRoom = room > LEAST_ROOM ? room : LEAST_ROOM;
  high = 1;
  highRoom = roomAtEnd;
  return passedBySizeAlone(l) ? bySize(l) : byTrials(l, accuracy);
}

function passedBySizeAlone(l: number): boolean {
  const deepest = lnKDeepest[l] as number;
  const end = lnKEnd[l] as number;
  const most = mostLnK[l] as number;
  return (
    deepest < most &&
    end < most &&
    deepest > (lowDeepest[l] as number) &&
    deepest < (highDeepest[l] as number) &&
    end > (lowEnd[l] as number) &&
    end < (highEnd[l] as number)
  );
}

/** Where size alone decides, the curve is enough and nothing is evaluated. */
function bySize(l: number): number {
  let x = chord();
  for (let i = 0; i < MOST_TRIALS; i++) {
    place(l, x);
    const room = sizeRoom(l);
    if (Math.abs(room) < ENOUGH) break;
    x = nearer(x, room);
  }
  eventFound = nearestEvent(BRANCH);
  return x;
}

/** Trials until the last stands near enough; the event itself is then where the parabola through them crosses. */
function byTrials(l: number, accuracy: LifeAccuracy): number {
  let x = chord();
  for (let i = 0; i < MOST_TRIALS; i++) {
    place(l, x);
    evaluate(l, l + 1, SPARE);
    evaluations[l] = (evaluations[l] as number) + 1;
    const room = roomLeft(l);
    const next = nearer(x, room);
    const left = (stepLength[l] as number) * Math.abs(next - x);
    x = next;
    if (left < accuracy.event || high - low < ENOUGH) break;
  }
  eventFound = nearestEvent(END_ABOVE);
  return x;
}

/** Where the line between the sides of the bracket crosses. */
const chord = () => low + ((high - low) * lowRoom) / (lowRoom - highRoom);

/** Where the inverse parabola through the bracket and a trial inside it crosses. */
const parabola = (x: number, room: number) =>
  (low * room * highRoom) / ((lowRoom - room) * (lowRoom - highRoom)) +
  (x * lowRoom * highRoom) / ((room - lowRoom) * (room - highRoom)) +
  (high * lowRoom * room) / ((highRoom - lowRoom) * (highRoom - room));

/** A better place than the trial, which becomes a side of the bracket. */
function nearer(x: number, room: number): number {
  const curved = parabola(x, room);
  narrow(x, room);
  return curved >= low && curved <= high ? curved : chord();
}

function narrow(x: number, room: number): void {
  if (room > 0) {
    low = x;
    lowRoom = room;
  } else {
    high = x;
    highRoom = room;
  }
}

function place(l: number, x: number): void {
  goTo(l, (startS[l] as number) + x * (stepLength[l] as number), qAt(l, x));
}
