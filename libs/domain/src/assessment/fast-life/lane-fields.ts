import { ENDS_FIELDS } from '../../fracture/stress-intensity/plate-surface-ends';

/** Fields of a lane beyond those of K: one flaw on its way, a stretch of a Float64Array. */
const F = ENDS_FIELDS;
/** Where the step starts: ln a + ln c, ln a − ln c, cycles; and its length. */
export const S0 = F;
export const Q0 = F + 1;
export const N0 = F + 2;
export const STEP = F + 3;
/** Slopes of q and of the cycles at the seven stages of the step. */
export const SLOPE_Q = F + 4;
export const SLOPE_N = F + 12;
/** The end of the step, and the coefficients of the curve through it. */
export const Q1 = F + 20;
export const N1 = F + 21;
export const CURVE_Q = F + 22;
export const CURVE_N = F + 23;
/** Pieces of the law in force at both points: ln C, m, and the bounds of ln K between which it holds. */
export const LN_C_DEEPEST = F + 24;
export const M_DEEPEST = F + 25;
export const LOW_DEEPEST = F + 26;
export const HIGH_DEEPEST = F + 27;
export const LN_C_END = F + 28;
export const M_END = F + 29;
export const LOW_END = F + 30;
export const HIGH_END = F + 31;
/** Ends of the way: greatest ln a, ln c and ln K range. */
export const MOST_LN_A = F + 32;
export const MOST_LN_C = F + 33;
export const MOST_LN_K = F + 34;
/** Search for an event inside the step: bracket with the room at its sides, and the trial. */
export const ROOM0 = F + 35;
export const LOW = F + 36;
export const ROOM_LOW = F + 37;
export const HIGH = F + 38;
export const ROOM_HIGH = F + 39;
export const TRIAL = F + 40;
/** Which margin the room is of. */
export const WHICH = F + 41;
export const PHASE = F + 42;
/** Pieces in force, as indices into the law. */
export const PIECE_DEEPEST = F + 43;
export const PIECE_END = F + 44;
export const EVALUATIONS = F + 45;
export const STOP = F + 46;
export const FLAW = F + 47;
export const LANE = 64;
