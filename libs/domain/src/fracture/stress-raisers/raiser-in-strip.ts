import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { LENGTH_HINT } from './hole-rules';
import { ellipseInStrip, holeInStrip, type StripFactor } from './strip-factors';

/** A hole in the middle of a strip pulled along its length; a circle has equal half axes. */
export interface StripInput {
  readonly halfAxisAcrossMm: number;
  readonly halfAxisAlongMm: number;
  readonly widthMm: number;
}

export interface RaiserInStrip extends StripFactor {
  readonly status: 'found';
  readonly source: string;
  /** How good the fit was found to be, in words. */
  readonly accuracy: string;
  /** Inside the formula, but beyond the results it was fitted to. */
  readonly extrapolated: boolean;
}

/**
 * Peak factor of a circular or elliptical hole in a strip, gross and net. Refuses sizes that are
 * impossible, a hole as wide as the strip, and an ellipse slenderer than the published fit.
 */
export function raiserInStrip(input: StripInput): RaiserInStrip | Refused {
  const { halfAxisAcrossMm: across, halfAxisAlongMm: along, widthMm } = input;
  const sizes = outOfBounds([
    size('halfAxisAcrossMm', 'Half axis across the load', across),
    size('halfAxisAlongMm', 'Half axis along the load', along),
    size('widthMm', 'Strip width', widthMm),
  ]);
  if (sizes.length > 0) return refused(...sizes);
  const share = (2 * across) / widthMm;
  const broken = outOfBounds([
    { ...SHARE, value: share },
    { ...SLENDERNESS, value: across / along },
  ]);
  if (broken.length > 0) return refused(...broken);
  const circle = across === along;
  return {
    status: 'found',
    ...(circle ? holeInStrip(share) : ellipseInStrip(across / along, share)),
    source: circle ? 'Howland 1930, fit in Roark' : 'Isida 1953, fit in Roark (from memory)',
    accuracy: circle
      ? 'within 0.9 % of own boundary collocation to 0.6 of the width, on the low side'
      : 'within 3 % of own boundary collocation for A/B from 1 to 4, up to 4 % low for A/B = 0.5',
    extrapolated: share > 0.5,
  };
}

const size = (input: keyof StripInput, name: string, value: number) => ({
  input,
  name,
  unit: 'mm',
  value,
  min: 0.1,
  max: 1e5,
  instead: LENGTH_HINT,
});

const SHARE = {
  input: 'halfAxisAcrossMm',
  name: 'Width of the hole over width of the strip',
  unit: '',
  min: 0,
  max: 0.9,
  instead: 'So little ligament is judged by its own strength, not by a peak factor.',
} as const;

const SLENDERNESS = {
  input: 'halfAxisAlongMm',
  name: 'Half axis across the load over half axis along it',
  unit: '',
  min: 0.5,
  max: 10,
  instead: 'Assess a slenderer hole as a crack; a flatter one by 1 + 2A/B in a wide plate.',
} as const;
