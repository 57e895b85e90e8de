import { weldToeBending, weldToeMembrane } from '../fracture/stress-intensity/weld-toe-mk';
import { mm } from '../units/quantity';
import type { CheckRow } from './check-row';

const EQUATION =
  'JCSS Probabilistic Model Code, fatigue annex (weld toe, two-dimensional): the table in a second, separate program';

/** z/B, L/B, membrane or bending, Mk. */
const VALUES = [
  [0.005, 1, 'membrane', 2.63566054124],
  [0.2, 1, 'membrane', 1.0566315959],
  [0.1, 3, 'membrane', 1.31546134974],
  [0.01, 0.5, 'bending', 1.62179596171],
  [0.1, 0.5, 'bending', 1],
] as const;

/** z/B, L/B, Mk of membrane stress, joint. */
const ELEMENTS = [
  [0.005, 2, 3.27, 'cruciform joint, leg 0.5 B'],
  [0.01, 2, 2.627, 'cruciform joint, leg 0.5 B'],
  [0.05, 2, 1.616, 'cruciform joint, leg 0.5 B'],
  [0.1, 2, 1.342, 'cruciform joint, leg 0.5 B'],
  [0.005, 1, 2.546, 'T joint on one side, leg 0.25 B'],
  [0.02, 1, 1.686, 'T joint on one side, leg 0.25 B'],
  [0.1, 1, 1.143, 'T joint on one side, leg 0.25 B'],
] as const;

const MK = { membrane: weldToeMembrane, bending: weldToeBending } as const;

const equation: readonly CheckRow[] = VALUES.map(([z, length, mode, mk], i) => ({
  id: `KM-${i + 1}`,
  group: 'Stress intensity',
  quantity: `Mk of ${mode} stress at a weld toe, z/B ${z}, L/B ${length}`,
  published: mk,
  unit: '',
  tolerance: 1e-6,
  kind: 'independent computation',
  source: EQUATION,
  compute: () => MK[mode](mm(z), mm(length), mm(1)),
}));

const elements: readonly CheckRow[] = ELEMENTS.map(([z, length, mk, joint], i) => ({
  id: `KMF-${i + 1}`,
  group: 'Stress intensity',
  quantity: `Mk of membrane stress, ${joint}, z/B ${z}`,
  published: mk,
  unit: '',
  tolerance: 0.08,
  kind: 'independent computation',
  source: 'own finite elements in two dimensions of the joint, with the weight function of a strip',
  compute: () => weldToeMembrane(mm(z), mm(length), mm(1)),
}));

/** Magnification of K by the toe of a weld. */
export const WELD_TOE_CHECKS: readonly CheckRow[] = [...equation, ...elements];
