import { endsLanes } from '../../fracture/stress-intensity/plate-surface-ends';

/** Flaws followed side by side: the processor then works on one while another waits for its result. */
export const WIDTH = 32;

const list = (each = 1) => new Float64Array(each * WIDTH);

/** What K is asked for: size and stress of every lane, and its answer. */
export const ends = endsLanes(WIDTH);
export const { lnDepth, lnAspect, deep, lnKDeepest, lnKEnd } = ends;

/** Start of the step in s = ln a + ln c, its q = ln(a/c), and the cycles gone; length of the step in s. */
export const startS = list();
export const startQ = list();
export const startN = list();
export const stepLength = list();
/** End of the step. */
export const endQ = list();
export const endN = list();

/** Places of evaluation in a step: the seven stages of the method. */
export const STAGES = 7;
export const LAST = STAGES - 1;
/** dq/ds and dN/ds at every stage, stage by stage. */
export const slopeQ = list(STAGES);
export const slopeN = list(STAGES);
/** Last coefficient of the curves through the step. */
export const curveQ = list();
export const curveN = list();

/** Piece of the law in force at each point, and what it says: ln C, m and the ln K between which it holds. */
export const pieceDeepest = new Int32Array(WIDTH);
export const pieceEnd = new Int32Array(WIDTH);
export const lnCDeepest = list();
export const mDeepest = list();
export const lowDeepest = list();
export const highDeepest = list();
export const lnCEnd = list();
export const mEnd = list();
export const lowEnd = list();
export const highEnd = list();

/** Ends of the way: greatest ln a, ln c and ln ΔK. */
export const mostLnA = list();
export const mostLnC = list();
export const mostLnK = list();

/** Room to the nearest event at the start of the step. */
export const startRoom = list();
/** Cycles of the step, and its error as a multiple of what is allowed. */
export const gain = list();
export const stepError = list();

/** Flaw of the table in the lane; none once the table is done. */
export const flawAt = new Int32Array(WIDTH);
export const NO_FLAW = -1;
export const evaluations = new Int32Array(WIDTH);
