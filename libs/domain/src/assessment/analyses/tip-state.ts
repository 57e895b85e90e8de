import { energyRelease } from '../../fracture/tip-field/energy-release';
import { checkElasticUse, type ElasticUse } from '../../fracture/tip-field/linear-elastic-use';
import type { MapSubject } from '../../fracture/tip-field/map-field';
import type { PlaneCondition } from '../../fracture/stress-state';
import { hasHeight } from '../../geometry/flaw-kind';
import type { Refused } from '../../geometry/refusal';
import { toMPaSqrtM } from '../../units/convert';
import { mpa, mpaSqrtMm } from '../../units/quantity';
import type { AssessmentInput } from '../assessment-input';
import { prepareCase } from '../prepare-case';
import { standing } from '../standing';

/** What surrounds the governing point of the crack front. */
export interface TipState {
  readonly status: 'found';
  readonly angleDeg: number;
  /** Primary and secondary stress together [MPa·√m]. */
  readonly kMPaSqrtM: number;
  /** Energy release rate at that K, K²/E′ [N/mm, that is kJ/m²]. */
  readonly energyReleaseNPerMm: number;
  /** Plane stress or plane strain, as the wall is thick enough for it. */
  readonly condition: PlaneCondition;
  readonly elasticUse: ElasticUse;
  /** Half the side of a square around the tip that shows the yielded zone [mm]. */
  readonly reachMm: number;
  readonly yieldMPa: number;
  readonly poissonsRatio: number;
  /** The field to be drawn: the near-tip field of this K. */
  readonly subject: MapSubject;
}

/** The elastic field around the governing tip, and whether linear elasticity alone may judge the flaw. */
export function tipState(input: AssessmentInput): TipState | Refused {
  const prepared = prepareCase(input);
  if (prepared.status === 'refused') return prepared;
  const { section, flaw } = prepared;
  const point = standing(section, flaw);
  const { material, poissonsRatio, wall } = section.flaw;
  const k = point.at.kPrimary + point.at.kSecondary;
  const elasticUse = checkElasticUse({
    intensity: k,
    yieldMPa: material.yieldMPa,
    crackMm: hasHeight(flaw.kind) ? flaw.a : flaw.c,
    ligamentMm: hasHeight(flaw.kind) ? section.ligament(flaw.a) : ahead(wall.width, flaw.c),
    thicknessMm: wall.thickness,
  });
  if (elasticUse.status === 'refused') return elasticUse;
  const condition = elasticUse.verdict === 'plane strain' ? 'plane strain' : 'plane stress';
  const elastic = {
    youngsModulus: mpa(material.youngsModulusMPa),
    poisson: poissonsRatio,
    condition,
  } as const;
  return {
    status: 'found',
    angleDeg: point.angle,
    kMPaSqrtM: toMPaSqrtM(k),
    energyReleaseNPerMm: energyRelease(elastic, mpaSqrtMm(k)),
    condition,
    elasticUse,
    // the zone of plane stress reaches about twice its radius
    reachMm: 4 * elasticUse.plasticRadiusMm.planeStress,
    yieldMPa: material.yieldMPa,
    poissonsRatio,
    subject: { kind: 'near-tip', opening: k, sliding: 0, alongMPa: 0 },
  };
}

// in a shell or a very wide plate the wall ahead is as long as it is looked at
const WIDE = 1e4;
const ahead = (width: number, c: number): number =>
  Number.isFinite(width) ? Math.max(width / 2 - c, 0) : WIDE;
