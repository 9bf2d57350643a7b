const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A number as a reader of exam papers expects it: "−1.5", "12,500", "3.6 × 10⁶". */
export function numberWords(value: number): string {
  const size = Math.abs(value);
  const sign = value < 0 ? '−' : '';
  if (size !== 0 && (size >= 1e6 || size < 1e-4)) {
    const [digits = '', power = '0'] = size.toExponential().split('e');
    return `${sign}${shortDigits(Number(digits))} × 10${raised(Number(power))}`;
  }
  const [whole = '', decimals] = shortDigits(size).split('.');
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(?:\d{3})+$)/gu, ',') : whole;
  return `${sign}${grouped}${decimals === undefined ? '' : `.${decimals}`}`;
}

/** A number with its unit: "1.2 mol/dm³", "£3.50", "42%", "60°". */
export function quantityWords(value: number, unit: string | undefined): string {
  if (unit === undefined) return numberWords(value);
  if (unit === '£') return `£${Number.isInteger(value) ? numberWords(value) : value.toFixed(2)}`;
  return unit === '%' || unit === '°' ? `${numberWords(value)}${unit}` : `${numberWords(value)} ${unit}`;
}

/** At most 12 significant figures, so that 0.1 + 0.2 reads as 0.3. */
const shortDigits = (size: number): string => String(Number(size.toPrecision(12)));

const raised = (power: number): string =>
  `${power < 0 ? '⁻' : ''}${[...String(Math.abs(power))].map((digit) => RAISED[Number(digit)] ?? '').join('')}`;
