import { hexOf, type Linear } from '../../styles/contrast.ts';

/*
 * A scale from pale straw to steel blue, even in the lightness of Oklab (B. Ottosson, "A perceptual color space for
 * image processing", 2020) and rising in one direction only, so that it is read with every colour vision and in grey.
 * Each theme keeps to lightnesses on which its ink has a contrast of at least 4.5 : 1.
 */
const ENDS = {
  light: { from: [0.975, 0.03, 95], to: [0.72, 0.095, 250] },
  dark: { from: [0.29, 0.025, 250], to: [0.5, 0.095, 85] },
} as const;

const STEPS = 40;

/** Oklab to linear light, by the matrices of the paper. */
function linearOfOklab(lightness: number, a: number, b: number): Linear {
  const l = (lightness + 0.3963377774 * a + 0.2158037573 * b) ** 3;
  const m = (lightness - 0.1055613458 * a - 0.0638541728 * b) ** 3;
  const s = (lightness - 0.0894841775 * a - 1.291485548 * b) ** 3;
  return [
    4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s,
    -1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s,
    -0.0041960863 * l - 0.7034186147 * m + 1.707614701 * s,
  ];
}

const cartesian = ([lightness, chroma, hue]: readonly [number, number, number]) => {
  const turn = (hue * Math.PI) / 180;
  return [lightness, chroma * Math.cos(turn), chroma * Math.sin(turn)] as const;
};

function scaleOf(dark: boolean): readonly string[] {
  const { from, to } = ENDS[dark ? 'dark' : 'light'];
  const [start, end] = [cartesian(from), cartesian(to)];
  const at = (which: 0 | 1 | 2, share: number) => start[which] + (end[which] - start[which]) * share;
  return Array.from({ length: STEPS + 1 }, (_, step) => {
    const share = step / STEPS;
    return hexOf(linearOfOklab(at(0, share), at(1, share), at(2, share)));
  });
}

const SCALES = { light: scaleOf(false), dark: scaleOf(true) } as const;

/** The colours of the scale from the lowest capacity to the highest. */
export const heatScale = (dark: boolean): readonly string[] => SCALES[dark ? 'dark' : 'light'];

/** The ground of a cell. A table of one value alone is the middle of the scale. */
export function heatOf(value: number, lowest: number, highest: number, dark: boolean): string {
  const share = highest > lowest ? (value - lowest) / (highest - lowest) : 0.5;
  const step = Math.round(Math.min(1, Math.max(0, share)) * STEPS);
  return heatScale(dark)[step] ?? '';
}
