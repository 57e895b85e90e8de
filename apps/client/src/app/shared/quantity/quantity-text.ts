/** A number to a number of decimals with its unit behind a narrow no-break space; an em dash where there is none. */
export function quantityText(value: number | null | undefined, unit: string, digits = 1): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '—';
  return unit ? `${numberText(value, digits)}\u202f${unit}` : numberText(value, digits);
}

/** A number with at most so many decimals, thousands apart, and a true minus sign. */
export function numberText(value: number, digits = 1): string {
  return value
    .toLocaleString('en-GB', { maximumFractionDigits: digits, minimumFractionDigits: 0 })
    .replaceAll(',', '\u202f')
    .replace('-', '−');
}
