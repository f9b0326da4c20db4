/**
 * Reads a number as people type it: a decimal comma or point, spaces between thousands, a true minus.
 * Returns undefined for anything that is not wholly a finite number.
 */
export function numberOf(text: string): number | undefined {
  const plain = text
    .replace(/[\s\u202f]/g, '')
    .replace('−', '-')
    .replace(',', '.');
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) return undefined;
  const value = Number(plain);
  return Number.isFinite(value) ? value : undefined;
}
