import { logOfAny } from '../../numerics/exp-log';
import {
  deep,
  highDeepest,
  highEnd,
  lnAspect,
  lnDepth,
  lnKDeepest,
  lnKEnd,
  lowDeepest,
  lowEnd,
  mostLnA,
  mostLnC,
  mostLnK,
} from './lanes';

/** Events of the way; those up to BRANCH are decided by size alone. */
export const DEPTH = 0;
export const LENGTH = 1;
export const SHORT = 2;
export const LONG = 3;
export const BRANCH = 4;
export const TOUGHNESS = 5;
export const DEEPEST_BELOW = 6;
export const DEEPEST_ABOVE = 7;
export const END_BELOW = 8;
export const END_ABOVE = 9;

/** a/c to which the solution holds, and a/c from which its rule for long flaws leaves a/t = 0.8 alone. */
export const SHORTEST = 2;
export const LONGEST = 0.04;
const LN_SHORTEST = logOfAny(SHORTEST);
const LN_LONGEST = logOfAny(LONGEST);

/** Room to each event, of the lane last asked for. */
const rooms = new Float64Array(END_ABOVE + 1);

/** Least room to the events that size alone decides. */
export function sizeRoom(l: number): number {
  takeSizeRooms(l);
  return least(BRANCH);
}

/** Least room to all events where the lane was last evaluated. */
export function roomLeft(l: number): number {
  const deepest = lnKDeepest[l] as number;
  const end = lnKEnd[l] as number;
  takeSizeRooms(l);
  rooms[TOUGHNESS] = (mostLnK[l] as number) - Math.max(deepest, end);
  rooms[DEEPEST_BELOW] = deepest - (lowDeepest[l] as number);
  rooms[DEEPEST_ABOVE] = (highDeepest[l] as number) - deepest;
  rooms[END_BELOW] = end - (lowEnd[l] as number);
  rooms[END_ABOVE] = (highEnd[l] as number) - end;
  return least(END_ABOVE);
}

/** The event nearest to the lane last asked for, of those up to `last`. */
export function nearestEvent(last: number): number {
  let which = 0;
  for (let i = 1; i <= last; i++) if ((rooms[i] as number) < (rooms[which] as number)) which = i;
  return which;
}

function takeSizeRooms(l: number): void {
  const lnA = lnDepth[l] as number;
  const q = lnAspect[l] as number;
  rooms[DEPTH] = (mostLnA[l] as number) - lnA;
  rooms[LENGTH] = (mostLnC[l] as number) - lnA + q;
  rooms[SHORT] = LN_SHORTEST - q;
  rooms[LONG] = q - LN_LONGEST;
  rooms[BRANCH] = deep[l] === 0 ? -q : q;
}

function least(last: number): number {
  let room = rooms[0] as number;
  for (let i = 1; i <= last; i++) room = Math.min(room, rooms[i] as number);
  return room;
}
