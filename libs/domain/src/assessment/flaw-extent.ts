import type { Crack } from '../geometry/crack';
import type { FlawKind } from '../geometry/flaw-kind';

/** The relative depths between which a flaw lies, from the face it is measured from. */
export function flawExtent(kind: FlawKind, crack: Crack): readonly [from: number, to: number] {
  const { a, ligament, thickness } = crack;
  switch (kind) {
    case 'embedded':
      return [ligament / thickness, (ligament + 2 * a) / thickness];
    case 'through-wall':
    case 'edge':
      return [0, 1];
    default:
      return [0, Math.min(a / thickness, 1)];
  }
}
