/** A number as people write it, and the unit behind it as text. */
export interface NumberText {
  readonly value: number;
  readonly unit: string;
}

const sign = '([+-]?)';
const mixed = new RegExp(`^${sign}(\\d+)[ -](\\d+)/(\\d+)(?![\\d.])\\s*(.*)$`);
const fraction = new RegExp(`^${sign}(\\d+)/(\\d+)(?![\\d.])\\s*(.*)$`);
const decimal = new RegExp(
  `^${sign}((?:\\d+\\.?\\d*|\\.\\d+)(?:e[+-]?\\d+)?)(?![\\d.,])\\s*(.*)$`,
  'i',
);

/**
 * Reads `0.02 in`, `1/4 in`, `1 1/4 in`, `3e-3 mm`, `365pF`. Null for anything else, a decimal
 * comma included: `1,600` could mean either of two numbers.
 */
export function readNumberText(text: string): NumberText | null {
  const trimmed = text.trim().replace(/\u2212/g, '-');
  const signed = (mark: string | undefined, value: number) => (mark === '-' ? -value : value);

  const asMixed = mixed.exec(trimmed);
  if (asMixed) {
    const [, mark, whole, over, under, unit] = asMixed;
    return {
      value: signed(mark, Number(whole) + Number(over) / Number(under)),
      unit: unit ?? '',
    };
  }
  const asFraction = fraction.exec(trimmed);
  if (asFraction) {
    const [, mark, over, under, unit] = asFraction;
    return { value: signed(mark, Number(over) / Number(under)), unit: unit ?? '' };
  }
  const asDecimal = decimal.exec(trimmed);
  if (!asDecimal) return null;
  const [, mark, digits, unit] = asDecimal;
  return { value: signed(mark, Number(digits)), unit: unit ?? '' };
}
