/** Linear red, green and blue, 0 to 1. */
export type Linear = readonly [number, number, number];

const toLinear = (value: number) => (value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4);
const toEncoded = (value: number) =>
  value <= 0.0031308 ? value * 12.92 : 1.055 * value ** (1 / 2.4) - 0.055;

/** `#rrggbb` to linear light. */
export function linearOf(hex: string): Linear {
  const channel = (at: number) => toLinear(parseInt(hex.slice(at, at + 2), 16) / 255);
  return [channel(1), channel(3), channel(5)];
}

export function hexOf(linear: Linear): string {
  const channel = (value: number) =>
    Math.round(toEncoded(Math.min(1, Math.max(0, value))) * 255)
      .toString(16)
      .padStart(2, '0');
  return `#${linear.map(channel).join('')}`;
}

/** Relative luminance of WCAG 2.2. */
export const luminanceOf = ([r, g, b]: Linear): number => 0.2126 * r + 0.7152 * g + 0.0722 * b;

/** Contrast ratio of WCAG 2.2, from 1 to 21. */
export function contrast(one: string, other: string): number {
  const [a, b] = [luminanceOf(linearOf(one)), luminanceOf(linearOf(other))];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

/** The same hue at a given luminance: darkened by scaling, lightened by mixing with white. */
export function atLuminance(hex: string, luminance: number): string {
  const base = linearOf(hex);
  const own = luminanceOf(base);
  if (luminance <= own) return hexOf(base.map((value) => (value * luminance) / own) as unknown as Linear);
  const share = (luminance - own) / (1 - own);
  return hexOf(base.map((value) => value + (1 - value) * share) as unknown as Linear);
}
