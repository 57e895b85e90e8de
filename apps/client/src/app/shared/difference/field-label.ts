/** A field name of the records as words and unit. */
export interface FieldLabel {
  readonly label: string;
  readonly unit: string;
}

/** Endings of field names that carry a unit; the longest that fits counts. */
const UNITS: readonly (readonly [ending: string, unit: string])[] = [
  ['MpaSqrtMm', 'MPa√mm'],
  ['MPaSqrtMm', 'MPa√mm'],
  ['MpaSqrtM', 'MPa√m'],
  ['MPaSqrtM', 'MPa√m'],
  ['MmPerYear', 'mm/year'],
  ['PerYear', 'per year'],
  ['Mpa', 'MPa'],
  ['MPa', 'MPa'],
  ['Mm', 'mm'],
  ['Percent', '%'],
  ['Months', 'months'],
  ['Years', 'years'],
  ['Days', 'days'],
  ['Hours', 'h'],
  ['Deg', '°'],
  ['C', '°C'],
];

/** Names whose words are not those of the name. */
const NAMES: Readonly<Record<string, FieldLabel>> = {
  lifeFraction: { label: 'Share of the remaining life before the next look', unit: '' },
  codeMaximumMonths: { label: 'Longest interval', unit: 'months' },
  maximumMonthsByMechanism: { label: 'Longest interval', unit: 'months' },
  heightAllowanceMmByTechnique: { label: 'Height allowance', unit: 'mm' },
  lengthAllowanceMmByTechnique: { label: 'Length allowance', unit: 'mm' },
  dueSoonDays: { label: 'Due soon within', unit: 'days' },
  reminderLeadDays: { label: 'Reminders before the due date', unit: 'days' },
  remindWhileOverdue: { label: 'Daily reminders while overdue', unit: '' },
  reportingDays: { label: 'Time for report and assessment', unit: 'working days' },
  number: { label: 'Number', unit: '' },
  accessUntil: { label: 'Last day of access', unit: '' },
  active: { label: 'Has access', unit: '' },
  email: { label: 'E-mail', unit: '' },
  certificateNo: { label: 'Certificate number', unit: '' },
  certificateValidUntil: { label: 'Certificate valid until', unit: '' },
  sha256: { label: 'SHA-256', unit: '' },
};

/** Label and unit of a field, e.g. `wallMm` → wall [mm]; the path leads into nested records. */
export function fieldLabel(path: readonly string[]): FieldLabel {
  const parts = path.map((name) => NAMES[name] ?? fromName(name));
  const unit = parts.map((part) => part.unit).findLast((each) => each !== '') ?? '';
  return { label: parts.map((part) => part.label).join(', '), unit };
}

function fromName(name: string): FieldLabel {
  const [ending, unit] = UNITS.find(([each]) => name.endsWith(each) && name !== each) ?? ['', ''];
  // a capital before the ending means that it is part of a word, as in "NDC"
  const fits = ending !== '' && /[a-z0-9]$/.test(name.slice(0, -ending.length));
  return { label: inWords(fits ? name.slice(0, -ending.length) : name), unit: fits ? unit : '' };
}

/** `insideDiameter` → Inside diameter. A name that is no identifier stays as it is. */
function inWords(name: string): string {
  if (!/^[a-z][a-zA-Z0-9]*$/.test(name)) return name;
  const words = name
    .replaceAll(/([a-z0-9])([A-Z])/g, '$1 $2')
    .toLowerCase()
    .replace(/ on$/, '')
    .replace(/ id$/, '');
  return words.charAt(0).toUpperCase() + words.slice(1);
}
