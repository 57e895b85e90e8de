import { choosePieces, takePieces } from './choose-pieces';
import { evaluate } from './evaluate';
import { eventFound, findEvent } from './find-event';
import {
  deep,
  endN,
  endQ,
  evaluations,
  LAST,
  mostLnA,
  gain,
  mostLnC,
  pieceDeepest,
  pieceEnd,
  slopeN,
  slopeQ,
  startN,
  startQ,
  startRoom,
  startS,
  stepError,
  stepLength,
  WIDTH,
} from './lanes';
import type { LawPieces } from './law-pieces';
import type { LifeAccuracy } from './life-accuracy';
import { stopCode } from './life-stops';
import * as room from './room-left';
import { nAt, qAt } from './step-curve';
import { goTo } from './take-step';

/** The way goes on. */
export const GOING = -1;
const NO_GROWTH = stopCode('no growth');
const TOUGHNESS = stopCode('toughness');
const UNRESOLVED = stopCode('unresolved');

/** Cycles for each unit of the way from which on nothing grows. */
const STANDSTILL = 1e200;
/** A step this short is taken whatever its error. */
const SHORTEST_STEP = 1e-5;
/** Rounding that is no crossing. */
const ROUNDING = 1e-9;
/** A last step goes a little beyond the end, which is then found inside it. */
const BEYOND = 1.02;

/** Evaluates a flaw that was just boarded, and answers its stop when it has no way to go. */
export function setOut(l: number, law: LawPieces, accuracy: LifeAccuracy): number {
  evaluations[l] = 1;
  evaluate(l, l + 1, 0);
  choosePieces(l, law);
  return begin(l, accuracy);
}

/** Begins the first step from a place whose slopes were just taken. */
function begin(l: number, accuracy: LifeAccuracy): number {
  const left = room.roomLeft(l);
  startRoom[l] = left;
  if (left <= 0) {
    const stop = stopBy(room.nearestEvent(room.END_ABOVE));
    if (stop !== GOING) return stop;
  }
  if (!((slopeN[l] as number) < STANDSTILL)) return NO_GROWTH;
  measure(l, 1, accuracy);
  return GOING;
}

/** Length of the next step: the last times a factor, no longer than to the ends that can be foreseen. */
function measure(l: number, factor: number, { longestStep }: LifeAccuracy): void {
  const dq = slopeQ[l] as number;
  const lnA = 0.5 * ((startS[l] as number) + (startQ[l] as number));
  const lnC = lnA - (startQ[l] as number);
  const toDepth = (2 * BEYOND * ((mostLnA[l] as number) - lnA)) / (1 + dq + ROUNDING);
  const toLength = (2 * BEYOND * ((mostLnC[l] as number) - lnC)) / (1 - dq + ROUNDING);
  let h = (stepLength[l] as number) * factor;
  if (h > longestStep) h = longestStep;
  if (h > toDepth) h = toDepth;
  if (h > toLength) h = toLength;
  stepLength[l] = h > SHORTEST_STEP ? h : SHORTEST_STEP;
}

/**
 * Takes the step that was made, the part of it before an event, or none of it when its error is too large, and
 * answers the stop, or that the way goes on.
 */
export function settle(l: number, law: LawPieces, accuracy: LifeAccuracy): number {
  const done = (evaluations[l] as number) + LAST;
  evaluations[l] = done;
  if (done > accuracy.mostEvaluations) return UNRESOLVED;
  const h = stepLength[l] as number;
  const error = stepError[l] as number;
  const factor = 0.9 / Math.sqrt(Math.sqrt(error));
  if (error > 1 && h > SHORTEST_STEP) {
    measure(l, factor > 0.2 ? factor : 0.2, accuracy);
    return GOING;
  }
  endN[l] = (startN[l] as number) + (gain[l] as number);
  const left = room.roomLeft(l);
  if (left < -ROUNDING) return stopAt(l, findEvent(l, left, accuracy), law, accuracy);
  startS[l] = (startS[l] as number) + h;
  startQ[l] = endQ[l] as number;
  startN[l] = endN[l] as number;
  startRoom[l] = left;
  slopeQ[l] = slopeQ[LAST * WIDTH + l] as number;
  slopeN[l] = slopeN[LAST * WIDTH + l] as number;
  measure(l, factor < 4 ? factor : 4, accuracy);
  return GOING;
}

/** Ends the step at an event: the way is over there, or goes on by what holds beyond it. */
function stopAt(l: number, x: number, law: LawPieces, accuracy: LifeAccuracy): number {
  const q = qAt(l, x);
  startN[l] = nAt(l, x);
  startS[l] = (startS[l] as number) + x * (stepLength[l] as number);
  startQ[l] = q;
  const stop = stopBy(eventFound);
  if (stop !== GOING) return stop;
  pass(l, eventFound);
  takePieces(l, law);
  goTo(l, startS[l] as number, q);
  evaluations[l] = (evaluations[l] as number) + 1;
  evaluate(l, l + 1, 0);
  return begin(l, accuracy);
}

/** Stop of an event, or that the way goes on beyond it. */
function stopBy(event: number): number {
  if (event < room.BRANCH) return event;
  return event === room.TOUGHNESS ? TOUGHNESS : GOING;
}

function pass(l: number, event: number): void {
  if (event === room.BRANCH) deep[l] = 1 - (deep[l] as number);
  else if (event === room.DEEPEST_BELOW) pieceDeepest[l] = (pieceDeepest[l] as number) - 1;
  else if (event === room.DEEPEST_ABOVE) pieceDeepest[l] = (pieceDeepest[l] as number) + 1;
  else if (event === room.END_BELOW) pieceEnd[l] = (pieceEnd[l] as number) - 1;
  else pieceEnd[l] = (pieceEnd[l] as number) + 1;
}
