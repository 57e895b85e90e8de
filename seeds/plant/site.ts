/** Day the scenario was written for; every date moves with the day the plant is seeded. */
export const SCENARIO_DAY = '2026-12-01';

export const SITE = { code: 'SALT', name: 'Saltmere Works', timeZone: 'Europe/London' } as const;

export const UNITS = [
  { code: 'U100', name: 'Hydrotreating' },
  { code: 'U200', name: 'Amine gas treating' },
  { code: 'U300', name: 'Steam and condensate' },
  { code: 'U400', name: 'Batch polymerisation and pressure-swing adsorption' },
  { code: 'U500', name: 'Liquefied gas storage and loading' },
] as const;

export const WINDOWS = [
  {
    code: 'SD-27A',
    units: ['U400'],
    kind: 'short shutdown',
    startsOn: '2027-02-08',
    endsOn: '2027-02-14',
    scopeFreezeOn: '2026-12-18',
    name: 'Short shutdown, batch area',
  },
  {
    code: 'TA-27',
    units: ['U200', 'U300'],
    kind: 'turnaround',
    startsOn: '2027-05-03',
    endsOn: '2027-05-28',
    scopeFreezeOn: '2026-11-02',
    name: 'Turnaround, amine and steam',
  },
  {
    code: 'SD-27B',
    units: ['U400'],
    kind: 'short shutdown',
    startsOn: '2027-09-06',
    endsOn: '2027-09-12',
    scopeFreezeOn: '2027-07-05',
    name: 'Short shutdown, batch area',
  },
  {
    code: 'TA-28',
    units: ['U100'],
    kind: 'turnaround',
    startsOn: '2028-04-10',
    endsOn: '2028-05-12',
    scopeFreezeOn: '2027-10-11',
    name: 'Turnaround, hydrotreating',
  },
  {
    code: 'SD-28C',
    units: ['U500'],
    kind: 'short shutdown',
    startsOn: '2028-09-04',
    endsOn: '2028-09-22',
    scopeFreezeOn: '2028-06-05',
    name: 'Inerting window, gas storage',
  },
] as const;
