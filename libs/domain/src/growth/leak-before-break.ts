import { outOfBounds, refused, type Refused } from '../geometry/refusal';
import { throughWallHalfLength, THROUGH_WALL_RULE } from './recategorise';

/** One condition of the case for leak before break. */
export interface LeakCondition {
  readonly key: string;
  readonly text: string;
  /** Null: nobody has said; it counts as not met. */
  readonly met: boolean | null;
  /** Numbers or the statement it rests on. */
  readonly basis: string;
}

/** What a person has to state, since no computation can; all of them common practice. */
export const LEAK_STATEMENTS = [
  {
    key: 'leak watched',
    text: 'A leak of the detectable size is noticed and acted on before the flaw grows to its critical length.',
  },
  {
    key: 'no sudden load',
    text: 'No water hammer, relief thrust, impact or other sudden load acts on the flaw.',
  },
  {
    key: 'no long cracking',
    text: 'The mechanism does not crack along the whole length at once, as stress corrosion and corrosion fatigue may.',
  },
  {
    key: 'no brittle state',
    text: 'The toughness used holds at the lowest temperature at which the flaw is loaded, leak cooling included.',
  },
  {
    key: 'leak harmless',
    text: 'The leak itself does no harm: no toxic, flammable or erosive release that must not happen.',
  },
] as const;
export type LeakStatement = (typeof LEAK_STATEMENTS)[number]['key'];

export interface LeakQuestion {
  readonly depthMm: number;
  readonly halfLengthMm: number;
  readonly thicknessMm: number;
  /** Half length at which the flaw through the wall is no longer acceptable [mm]. */
  readonly criticalHalfLengthMm: number;
  /** Half length whose leak is certain to be noticed; null when it is not known [mm]. */
  readonly leakingHalfLengthMm: number | null;
  /** Factor on length to the critical one; 2 is common practice. */
  readonly factorOnLength: number;
  readonly statements: Readonly<Partial<Record<LeakStatement, boolean>>>;
}

/** Leak before break is shown by conditions, each met, or it is not shown; it is never simply so. */
export interface LeakBeforeBreak {
  readonly status: 'answered';
  readonly answer: 'shown' | 'not shown';
  readonly breakthroughHalfLengthMm: number;
  readonly breakthroughRule: string;
  readonly conditions: readonly LeakCondition[];
  /** In words, with the conditions it hangs on or that are missing. */
  readonly words: string;
}

/** Asks whether the flaw would leak, and be noticed, before it breaks. */
export function leakBeforeBreak(question: LeakQuestion): LeakBeforeBreak | Refused {
  const refusals = outOfBounds(rulesOf(question));
  if (refusals.length > 0) return refused(...refusals);
  const { depthMm, halfLengthMm, thicknessMm } = question;
  const breakthroughHalfLengthMm = throughWallHalfLength(depthMm, halfLengthMm, thicknessMm);
  const conditions = [
    ...lengthConditions(question, breakthroughHalfLengthMm),
    ...LEAK_STATEMENTS.map(({ key, text }) => stated(key, text, question.statements[key] ?? null)),
  ];
  const missing = conditions.filter(({ met }) => met !== true);
  return {
    status: 'answered',
    answer: missing.length === 0 ? 'shown' : 'not shown',
    breakthroughHalfLengthMm,
    breakthroughRule: THROUGH_WALL_RULE,
    conditions,
    words:
      missing.length === 0
        ? `Shown under ${conditions.length} conditions, each met; it holds only while they do.`
        : `Not shown: ${missing.map(({ key, met }) => `${key} (${met === null ? 'not stated' : 'not met'})`).join(', ')}.`,
  };
}

function lengthConditions(question: LeakQuestion, breakthrough: number): readonly LeakCondition[] {
  const { criticalHalfLengthMm: critical, leakingHalfLengthMm, factorOnLength } = question;
  const allowed = critical / factorOnLength;
  const against = `critical ${figure(2 * critical)} mm over ${factorOnLength}`;
  return [
    {
      key: 'breakthrough shorter than critical',
      text: 'The flaw is shorter when it breaks through the wall than the critical length, with the factor on length.',
      met: breakthrough < allowed,
      basis: `length at breakthrough ${figure(2 * breakthrough)} mm against ${against}`,
    },
    {
      key: 'leak noticed before critical',
      text: 'A flaw whose leak is certain to be noticed is shorter than the critical length, with the factor on length.',
      met: leakingHalfLengthMm === null ? null : leakingHalfLengthMm < allowed,
      basis:
        leakingHalfLengthMm === null
          ? 'the length with a detectable leak is not known'
          : `length with a detectable leak ${figure(2 * leakingHalfLengthMm)} mm against ${against}`,
    },
  ];
}

const stated = (key: string, text: string, met: boolean | null): LeakCondition => ({
  key,
  text,
  met,
  basis: met === null ? 'not stated' : 'stated by the assessor; common practice',
});

const figure = (value: number) => Number(value.toPrecision(4)).toString();

function rulesOf(question: LeakQuestion) {
  const { depthMm, halfLengthMm, thicknessMm, criticalHalfLengthMm } = question;
  const { leakingHalfLengthMm, factorOnLength } = question;
  const length = (input: string, name: string, value: number, max = 1e5) => ({
    input,
    name,
    unit: 'mm',
    value,
    min: 0,
    max,
    above: true,
    instead: 'Give it in millimetres.',
  });
  return [
    length('thicknessMm', 'Wall thickness', thicknessMm, 1000),
    length('depthMm', 'Depth', depthMm, Number.isFinite(thicknessMm) ? thicknessMm : 1000),
    length('halfLengthMm', 'Half length', halfLengthMm),
    length('criticalHalfLengthMm', 'Critical half length through the wall', criticalHalfLengthMm),
    ...(leakingHalfLengthMm === null
      ? []
      : [length('leakingHalfLengthMm', 'Half length with a detectable leak', leakingHalfLengthMm)]),
    {
      input: 'factorOnLength',
      name: 'Factor on length',
      unit: '',
      value: factorOnLength,
      min: 1,
      max: 10,
      instead: 'Use 2 unless another is justified.',
    },
  ];
}
