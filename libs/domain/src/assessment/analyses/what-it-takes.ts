import {
  leastAcceptable,
  type AcceptanceBoundary,
} from '../../fracture/limiting-flaw/acceptance-search';
import type { Refused } from '../../geometry/refusal';
import type { AssessmentInput } from '../assessment-input';
import { prepareCase } from '../prepare-case';
import { standing } from '../standing';

/** The inverse questions: what the flaw could bear, and what it needs. */
export interface WhatItTakes {
  readonly status: 'found';
  /** Largest factor on the primary load, and so on a pressure that makes it. */
  readonly loadFactor: number;
  /** Least toughness with which the flaw is acceptable [MPa·√m]. */
  readonly leastToughness: AcceptanceBoundary;
}

const TOUGHNESS = { least: 5, most: 1000 } as const;

/** Largest load and least toughness of the assessed flaw, each with all other inputs as given. */
export function whatItTakes(input: AssessmentInput): WhatItTakes | Refused {
  const prepared = prepareCase(input);
  if (prepared.status === 'refused') return prepared;
  const { section, flaw } = prepared;
  return {
    status: 'found',
    loadFactor: standing(section, flaw).reserveOnLoad,
    leastToughness: leastAcceptable({
      input: 'material.toughnessMPaSqrtM',
      name: 'toughness',
      unit: 'MPa·√m',
      ...TOUGHNESS,
      margin: (value) => marginWith(input, value),
    }),
  };
}

function marginWith(input: AssessmentInput, toughness: number): number {
  const { material } = input;
  const prepared = prepareCase({
    ...input,
    material: {
      ...material,
      toughnessMPaSqrtM: { ...material.toughnessMPaSqrtM, value: toughness },
    },
  });
  if (prepared.status === 'refused') return Number.NaN;
  return prepared.section.margin(prepared.flaw.a, prepared.flaw.c);
}
