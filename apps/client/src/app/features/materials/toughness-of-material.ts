import type { Given } from '@ligament/domain/units/provenance';
import type { RecordValue } from '../../shared/record-form/record-group';
import type { KnownOfToughness } from '../../shared/toughness/evidence';
import type { ToughnessAnswer } from '../../shared/toughness/toughness-answer';

type Origins = Readonly<Record<string, Pick<Given, 'provenance' | 'note'>>>;

const originsOf = (held: RecordValue) => (held['origins'] ?? {}) as Origins;

/** What the form of a material knows already of what a toughness is found from. */
export function toughnessKnown(held: RecordValue): KnownOfToughness {
  const origins = originsOf(held);
  const given = (name: string): Given => {
    const value = held[name];
    const { provenance, note } = origins[name] ?? { provenance: 'assumed', note: '' };
    return { value: typeof value === 'number' ? value : Number.NaN, provenance, note };
  };
  return {
    numbers: {
      yieldMPa: given('yieldMpa'),
      tensileMPa: given('tensileMpa'),
      youngsModulusMPa: given('youngsModulusMpa'),
      poissonsRatio: given('poissonsRatio'),
      temperatureC: given('toughnessTemperatureC'),
    },
  };
}

/** The record with the toughness that was found, its origin and its temperature. */
export const withToughness = (
  record: RecordValue,
  { given: { value, provenance, note }, temperatureC }: ToughnessAnswer,
): RecordValue => ({
  ...record,
  toughnessMpaSqrtM: value,
  toughnessTemperatureC: temperatureC,
  origins: { ...originsOf(record), toughnessMpaSqrtM: { provenance, note } },
});
