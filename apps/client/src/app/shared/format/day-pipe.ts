import { Pipe, type PipeTransform } from '@angular/core';
import { dayText, momentText } from './day-text';
import { daysInWords } from './days-in-words';

/** A calendar date (2026-11-10) as 10 Nov 2026. */
@Pipe({ name: 'day' })
export class DayPipe implements PipeTransform {
  transform(date: string | null | undefined): string {
    return dayText(date);
  }
}

/** An instant as 10 Nov 2026, 14:05 in the given time zone. */
@Pipe({ name: 'moment' })
export class MomentPipe implements PipeTransform {
  transform(instant: string | null | undefined, timeZone = 'UTC'): string {
    return momentText(instant, timeZone);
  }
}

/** A sentence with its calendar dates as a reader writes them. */
@Pipe({ name: 'days' })
export class DaysPipe implements PipeTransform {
  transform(sentence: string): string {
    return daysInWords(sentence);
  }
}
