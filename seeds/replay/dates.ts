import { daysAfter, daysBetween } from '@ligament/domain/scheduling/calendar-date';
import { SCENARIO_DAY } from '../plant/site';

/** Moves the dates of the scenario so that its last day is the day the plant is seeded. */
export function dateMover(today: string) {
  const shift = daysBetween(SCENARIO_DAY, today);
  const move = (date: string) => daysAfter(date, shift);
  return {
    move,
    /** Some days after a date of the scenario, but never after the seeding day. */
    after: (date: string, days: number) => {
      const day = daysAfter(move(date), days);
      return day > today ? today : day;
    },
  };
}

export type DateMover = ReturnType<typeof dateMover>;
