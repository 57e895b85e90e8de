import { DEEP, LN_ASPECT, LN_DEPTH, LN_K_DEEPEST, LN_K_END, plateSurfaceEnds } from '../../fracture/stress-intensity/plate-surface-ends';
import { exp } from '../../numerics/exp-log';
import * as L from './lane-fields';

// tableau of Dormand and Prince 1980, error weights and continuous extension (Hairer, Nørsett and Wanner, dopri5)
const [B1, B3, B4, B5, B6] = [35 / 384, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84] as const;
const [E1, E3, E4, E5, E6, E7] = [71 / 57600, -71 / 16695, 71 / 1920, -17253 / 339200, 22 / 525, -1 / 40] as const;
const [D1, D3, D4, D5, D6, D7] = [
  -12715105075 / 11282082432, 87487479700 / 32700410799, -10690763975 / 1880347072,
  701980252875 / 199316789632, -1453857185 / 822651844, 69997945 / 29380423,
] as const;

export const tune = { tolN: 1e-3, tolQ: 3e-3, hMax: 2, h0: 0.6, over: 1.02, evTol: 0.02, maxEv: 45 };
export const EVENT = 7;
export const DONE = 8;
export const law = { lnC: new Float64Array(3), m: new Float64Array(3), low: new Float64Array(3), high: new Float64Array(3), lnPeak: 0 };

export function evaluate(w: Float64Array, b: number): void {
  plateSurfaceEnds(w, b);
  const lnA = w[b + LN_DEPTH] as number;
  const ra = exp((w[b + L.LN_C_DEEPEST] as number) + (w[b + L.M_DEEPEST] as number) * (w[b + LN_K_DEEPEST] as number) - lnA);
  const rc = exp((w[b + L.LN_C_END] as number) + (w[b + L.M_END] as number) * (w[b + LN_K_END] as number) - lnA + (w[b + LN_ASPECT] as number));
  const time = 1 / (ra + rc);
  const stage = (w[b + L.PHASE] as number) | 0;
  w[b + L.SLOPE_N + stage] = time;
  w[b + L.SLOPE_Q + stage] = (ra - rc) * time;
}

function goTo(w: Float64Array, b: number, s: number, q: number) {
  w[b + LN_DEPTH] = 0.5 * (s + q);
  w[b + LN_ASPECT] = q;
}

export function pieces(w: Float64Array, b: number) {
  const d = w[b + L.PIECE_DEEPEST] as number;
  const e = w[b + L.PIECE_END] as number;
  w[b + L.LN_C_DEEPEST] = law.lnC[d] as number;
  w[b + L.M_DEEPEST] = law.m[d] as number;
  w[b + L.LOW_DEEPEST] = law.low[d] as number;
  w[b + L.HIGH_DEEPEST] = law.high[d] as number;
  w[b + L.LN_C_END] = law.lnC[e] as number;
  w[b + L.M_END] = law.m[e] as number;
  w[b + L.LOW_END] = law.low[e] as number;
  w[b + L.HIGH_END] = law.high[e] as number;
}

const LN2 = Math.LN2, LN004 = Math.log(0.04);
/** least margin at current point; index in WHICH */
export function room(w: Float64Array, b: number): number {
  const lnA = w[b + LN_DEPTH] as number;
  const q = w[b + LN_ASPECT] as number;
  const kd = w[b + LN_K_DEEPEST] as number;
  const ke = w[b + LN_K_END] as number;
  let least = (w[b + L.MOST_LN_A] as number) - lnA;
  let which = 0;
  let m = (w[b + L.MOST_LN_C] as number) - (lnA - q);
  if (m < least) { least = m; which = 1; }
  m = (w[b + L.MOST_LN_K] as number) - (kd > ke ? kd : ke);
  if (m < least) { least = m; which = 2; }
  m = LN2 - q;
  if (m < least) { least = m; which = 3; }
  m = q - LN004;
  if (m < least) { least = m; which = 4; }
  m = (w[b + DEEP] as number) === 0 ? -q : q;
  if (m < least) { least = m; which = 5; }
  m = kd - (w[b + L.LOW_DEEPEST] as number);
  if (m < least) { least = m; which = 6; }
  m = (w[b + L.HIGH_DEEPEST] as number) - kd;
  if (m < least) { least = m; which = 7; }
  m = ke - (w[b + L.LOW_END] as number);
  if (m < least) { least = m; which = 8; }
  m = (w[b + L.HIGH_END] as number) - ke;
  if (m < least) { least = m; which = 9; }
  w[b + L.WHICH] = which;
  return least;
}

function begin(w: Float64Array, b: number, h: number) {
  // not far beyond the ends that are known: depth and length
  const dq = w[b + L.SLOPE_Q] as number;
  const s = w[b + L.S0] as number, q = w[b + L.Q0] as number;
  const lnA = 0.5 * (s + q);
  const toA = (2 * ((w[b + L.MOST_LN_A] as number) - lnA)) / (1 + dq + 1e-9) * tune.over;
  const toC = (2 * ((w[b + L.MOST_LN_C] as number) - (lnA - q))) / (1 - dq + 1e-9) * tune.over;
  let len = h < tune.hMax ? h : tune.hMax;
  if (toA < len) len = toA;
  if (toC < len) len = toC;
  if (!(len > 1e-6)) len = 1e-6;
  w[b + L.STEP] = len;
  w[b + L.PHASE] = 1;
  goTo(w, b, s + 0.2 * len, q + len * 0.2 * dq);
}

export function advance(w: Float64Array, b: number): void {
  w[b + L.EVALUATIONS] = (w[b + L.EVALUATIONS] as number) + 1;
  const phase = (w[b + L.PHASE] as number) | 0;
  const k = b + L.SLOPE_Q;
  const h = w[b + L.STEP] as number;
  const s = w[b + L.S0] as number;
  const q = w[b + L.Q0] as number;
  switch (phase) {
    case 0: {
      const r = room(w, b);
      w[b + L.ROOM0] = r;
      if (!((w[b + L.SLOPE_N] as number) < 1e200)) { w[b + L.STOP] = 20; w[b + L.PHASE] = DONE; return; }
      begin(w, b, h);
      return;
    }
    case 1:
      goTo(w, b, s + 0.3 * h, q + h * ((3 / 40) * (w[k] as number) + (9 / 40) * (w[k + 1] as number)));
      break;
    case 2:
      goTo(w, b, s + 0.8 * h, q + h * ((44 / 45) * (w[k] as number) - (56 / 15) * (w[k + 1] as number) + (32 / 9) * (w[k + 2] as number)));
      break;
    case 3:
      goTo(w, b, s + (8 / 9) * h, q + h * ((19372 / 6561) * (w[k] as number) - (25360 / 2187) * (w[k + 1] as number) + (64448 / 6561) * (w[k + 2] as number) - (212 / 729) * (w[k + 3] as number)));
      break;
    case 4:
      goTo(w, b, s + h, q + h * ((9017 / 3168) * (w[k] as number) - (355 / 33) * (w[k + 1] as number) + (46732 / 5247) * (w[k + 2] as number) + (49 / 176) * (w[k + 3] as number) - (5103 / 18656) * (w[k + 4] as number)));
      break;
    case 5: {
      const q1 = q + h * (B1 * (w[k] as number) + B3 * (w[k + 2] as number) + B4 * (w[k + 3] as number) + B5 * (w[k + 4] as number) + B6 * (w[k + 5] as number));
      w[b + L.Q1] = q1;
      goTo(w, b, s + h, q1);
      break;
    }
    case 6:
      return judge(w, b);
    default:
      return search(w, b);
  }
  w[b + L.PHASE] = phase + 1;
}

function judge(w: Float64Array, b: number): void {
  const k = b + L.SLOPE_Q;
  const n = b + L.SLOPE_N;
  const h = w[b + L.STEP] as number;
  const n0 = w[b + L.N0] as number;
  const gain = h * (B1 * (w[n] as number) + B3 * (w[n + 2] as number) + B4 * (w[n + 3] as number) + B5 * (w[n + 4] as number) + B6 * (w[n + 5] as number));
  const eq = Math.abs(h * (E1 * (w[k] as number) + E3 * (w[k + 2] as number) + E4 * (w[k + 3] as number) + E5 * (w[k + 4] as number) + E6 * (w[k + 5] as number) + E7 * (w[k + 6] as number)));
  const en = Math.abs(h * (E1 * (w[n] as number) + E3 * (w[n + 2] as number) + E4 * (w[n + 3] as number) + E5 * (w[n + 4] as number) + E6 * (w[n + 5] as number) + E7 * (w[n + 6] as number)));
  const errN = en / (tune.tolN * (n0 + gain));
  const errQ = eq / tune.tolQ;
  let err = errN > errQ ? errN : errQ;
  if (!(err < 1e6)) err = 1e6;
  if (err < 1e-4) err = 1e-4;
  const factor = 0.9 / Math.sqrt(Math.sqrt(err));
  if (err > 1 && h > 1e-5) {
    begin(w, b, h * (factor < 0.2 ? 0.2 : factor));
    return;
  }
  w[b + L.N1] = n0 + gain;
  const r = room(w, b);
  if (r >= -1e-9) {
    w[b + L.S0] = (w[b + L.S0] as number) + h;
    w[b + L.Q0] = w[b + L.Q1] as number;
    w[b + L.N0] = n0 + gain;
    w[k] = w[k + 6] as number;
    w[n] = w[n + 6] as number;
    w[b + L.ROOM0] = r;
    begin(w, b, h * (factor > 4 ? 4 : factor));
    return;
  }
  w[b + L.CURVE_Q] = h * (D1 * (w[k] as number) + D3 * (w[k + 2] as number) + D4 * (w[k + 3] as number) + D5 * (w[k + 4] as number) + D6 * (w[k + 5] as number) + D7 * (w[k + 6] as number));
  w[b + L.CURVE_N] = h * (D1 * (w[n] as number) + D3 * (w[n + 2] as number) + D4 * (w[n + 3] as number) + D5 * (w[n + 4] as number) + D6 * (w[n + 5] as number) + D7 * (w[n + 6] as number));
  w[b + L.LOW] = 0;
  const r0 = w[b + L.ROOM0] as number;
  w[b + L.ROOM_LOW] = r0 > 0 ? r0 : 1e-12;
  w[b + L.HIGH] = 1;
  w[b + L.ROOM_HIGH] = r;
  w[b + L.PHASE] = EVENT;
  // next wanted step after the event, kept for the restart
  w[b + L.TRIAL] = 2;
  tryAt(w, b, (w[b + L.ROOM_LOW] as number) / ((w[b + L.ROOM_LOW] as number) - r));
}

function curve(y0: number, y1: number, k0: number, k1: number, c: number, h: number, x: number) {
  const d = y1 - y0;
  const p = h * k0 - d;
  return y0 + x * (d + (1 - x) * (p + x * (d - h * k1 - p + (1 - x) * c)));
}
const qAt = (w: Float64Array, b: number, x: number) => curve(w[b + L.Q0] as number, w[b + L.Q1] as number, w[b + L.SLOPE_Q] as number, w[b + L.SLOPE_Q + 6] as number, w[b + L.CURVE_Q] as number, w[b + L.STEP] as number, x);
const nAt = (w: Float64Array, b: number, x: number) => curve(w[b + L.N0] as number, w[b + L.N1] as number, w[b + L.SLOPE_N] as number, w[b + L.SLOPE_N + 6] as number, w[b + L.CURVE_N] as number, w[b + L.STEP] as number, x);

function tryAt(w: Float64Array, b: number, x: number) {
  w[b + L.TRIAL] = x;
  goTo(w, b, (w[b + L.S0] as number) + x * (w[b + L.STEP] as number), qAt(w, b, x));
}

function search(w: Float64Array, b: number): void {
  // slot 7 is past the seventh stage: slopes of a trial are not kept
  const r = room(w, b);
  const x = w[b + L.TRIAL] as number;
  const xl = w[b + L.LOW] as number, rl = w[b + L.ROOM_LOW] as number;
  const xh = w[b + L.HIGH] as number, rh = w[b + L.ROOM_HIGH] as number;
  // inverse quadratic through the three
  let next = (xl * r * rh) / ((rl - r) * (rl - rh)) + (x * rl * rh) / ((r - rl) * (r - rh)) + (xh * rl * r) / ((rh - rl) * (rh - r));
  if (r > 0) { w[b + L.LOW] = x; w[b + L.ROOM_LOW] = r; } else { w[b + L.HIGH] = x; w[b + L.ROOM_HIGH] = r; }
  const nl = w[b + L.LOW] as number, nh = w[b + L.HIGH] as number;
  if (!(next >= nl && next <= nh)) {
    const a = w[b + L.ROOM_LOW] as number, c = w[b + L.ROOM_HIGH] as number;
    next = nl + (nh - nl) * Math.min(Math.max(a / (a - c), 0.05), 0.95);
  }
  const move = Math.abs(next - x);
  const total = (w[b + L.STEP] as number) * move;
  if (r === 0 || total < tune.evTol || nh - nl < 1e-9) { land(w, b, r === 0 ? x : next); return; }
  tryAt(w, b, next);
}

function land(w: Float64Array, b: number, x: number) {
  const n = nAt(w, b, x);
  const q = qAt(w, b, x);
  const s = (w[b + L.S0] as number) + x * (w[b + L.STEP] as number);
  w[b + L.S0] = s; w[b + L.Q0] = q; w[b + L.N0] = n;
  goTo(w, b, s, q);
  const which = (w[b + L.WHICH] as number) | 0;
  if (which < 5) { w[b + L.STOP] = which; w[b + L.PHASE] = DONE; return; }
  if (which === 5) w[b + DEEP] = 1 - (w[b + DEEP] as number);
  else if (which === 6) w[b + L.PIECE_DEEPEST] = (w[b + L.PIECE_DEEPEST] as number) - 1;
  else if (which === 7) w[b + L.PIECE_DEEPEST] = (w[b + L.PIECE_DEEPEST] as number) + 1;
  else if (which === 8) w[b + L.PIECE_END] = (w[b + L.PIECE_END] as number) - 1;
  else w[b + L.PIECE_END] = (w[b + L.PIECE_END] as number) + 1;
  pieces(w, b);
  w[b + L.PHASE] = 0;
}
