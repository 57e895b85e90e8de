import { convertParisCoefficient } from '../units/convert-paris';
import type { CrackLaw, PowerOfRange } from './crack-law';
import { NO_THRESHOLD } from './crack-law';
import { FERRITIC_IN_AIR, inMetres, scope } from './crack-law-scopes';

const US = { growth: 'in', range: 'ksi·√in' } as const;
const METRIC = { growth: 'mm', range: 'MPa·√m' } as const;

/** A coefficient as published, in in/cycle and ksi·√in. */
const us = (coefficient: number, exponent: number): PowerOfRange => ({
  coefficient: convertParisCoefficient(coefficient, exponent, { from: US }),
  exponent,
});

const RANGE = inMetres([1, 110]);
const FERRITIC = scope({ range: RANGE, temperature: [20, 371] });

/** Reference laws of the nuclear codes. */
export const CODE_LAWS: readonly CrackLaw[] = [
  {
    form: 'asme ferritic air',
    key: 'ferritic-air-code',
    title: 'Ferritic steel, air, upper reference curve of ASME XI',
    environment: 'air',
    source: 'ASME XI A-4300(b)(1): 1.99e-10 in/cycle with ksi·√in (from memory)',
    ...us(1.99e-10, 3.07),
    threshold: FERRITIC_IN_AIR,
    scope: FERRITIC,
  },
  {
    form: 'asme ferritic air',
    key: 'ferritic-air-code-metric',
    title: 'Ferritic steel, air, metric form of the reference curve after JSME',
    environment: 'air',
    source: 'JSME fitness-for-service code: 3.88e-9 mm/cycle with MPa·√m (secondary source)',
    coefficient: convertParisCoefficient(3.88e-9, 3.07, { from: METRIC }),
    exponent: 3.07,
    threshold: FERRITIC_IN_AIR,
    scope: FERRITIC,
  },
  {
    form: 'asme ferritic water',
    key: 'ferritic-water-code',
    title: 'Ferritic steel, light-water reactor water, reference curve of ASME XI',
    environment: 'reactor water',
    source: 'ASME XI A-4300(b)(2), in/cycle with ksi·√in (from memory)',
    low: us(1.02e-12, 5.95),
    high: us(1.01e-7, 1.95),
    threshold: NO_THRESHOLD,
    scope: FERRITIC,
  },
  {
    form: 'austenitic air',
    key: 'austenitic-air-code',
    title: 'Austenitic steel, air, reference curve of ASME XI',
    environment: 'air',
    source: 'ASME XI C-8410, in/cycle with ksi·√in and °F (from memory)',
    ...us(10 ** -10.009, 3.3),
    threshold: NO_THRESHOLD,
    scope: scope({ range: RANGE, temperature: [20, 427] }),
  },
];
