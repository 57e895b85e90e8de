import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { KnownOfToughness } from '../../shared/toughness/evidence';

export const TOUGHNESS_PATH = 'material.toughnessMPaSqrtM';

/** What an assessment knows already of what a toughness is found from. */
export const toughnessKnown = ({ wall, material }: AssessmentInput): KnownOfToughness => ({
  numbers: {
    thicknessMm: wall.thicknessMm,
    yieldMPa: material.yieldMPa,
    tensileMPa: material.tensileMPa,
    youngsModulusMPa: material.youngsModulusMPa,
    poissonsRatio: material.poissonsRatio,
  },
});
