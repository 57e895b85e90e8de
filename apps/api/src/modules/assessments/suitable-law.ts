import type { Mechanism } from '@ligament/domain/contract/vocabulary';

interface Law {
  readonly key: string;
  readonly title: string;
  readonly environment: string;
}

/**
 * The growth law a draft starts with: for corrosion fatigue one for a wet environment, otherwise one for air; the
 * simplified upper-bound law before the others, since it needs no word on stress ratio. The engineer may choose another.
 */
export function suitableLaw<T extends Law>(
  laws: readonly T[],
  mechanism: Mechanism,
): T | undefined {
  const wet = mechanism === 'corrosion fatigue';
  const fits = (law: T) => /marine|water|corro/i.test(`${law.environment} ${law.title}`) === wet;
  const fitting = laws.filter(fits);
  return (
    fitting.find((law) => /simplified/i.test(`${law.key} ${law.title}`)) ?? fitting[0] ?? laws[0]
  );
}
