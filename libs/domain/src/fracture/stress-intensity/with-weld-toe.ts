import type { Crack } from '../../geometry/crack';
import type { Degrees, Mm } from '../../units/quantity';
import type { Influence, StressIntensitySolution } from './solution';
import { weldToeBending, weldToeMembrane } from './weld-toe-mk';

/** Depth at which the end of a flaw at the surface is taken [mm]; BS 7910 practice (from memory). */
const DEPTH_AT_SURFACE = 0.15;

/**
 * A solution for a surface flaw, magnified by the toe of a weld: Mk at z = a for the deepest point and at
 * z = 0.15 mm for the end, at the depth of the point in between. Higher stress terms are left to the upper
 * estimate of the highest stress, as Mk is known for membrane and bending only.
 */
export const withWeldToe = (
  solution: StressIntensitySolution,
  attachment: Mm,
): StressIntensitySolution => ({
  ...solution,
  key: `${solution.key}-weld-toe`,
  title: `${solution.title}, at the toe of a weld`,
  source: `${solution.source}; weld toe: Maddox and Andrews 1990 in the form of BS 7910, depth at the end from memory`,
  formula: `${solution.formula}; times Mk of membrane and of bending, z = a sin φ, at least 0.15 mm`,
  accuracy: `${solution.accuracy} Mk: within 8 % of finite elements of a cruciform and a T joint.`,
  influence: (crack, angle, into) => {
    solution.influence(crack, angle, into);
    magnify(crack, angle, attachment, into);
  },
  higher: null,
});

function magnify(crack: Crack, angle: Degrees, attachment: Mm, into: Influence): void {
  const depth = crack.a * Math.sin((angle * Math.PI) / 180);
  const z = Math.max(depth, Math.min(DEPTH_AT_SURFACE, crack.a)) as Mm;
  into.membrane *= weldToeMembrane(z, attachment, crack.thickness);
  const bending = weldToeBending(z, attachment, crack.thickness);
  into.bending *= bending;
  into.reversedBending *= bending;
}
