import type { FailingPart } from '@shared/engine/types.ts';
import { atLuminance, contrast } from './contrast.ts';

/*
 * Hues of the Okabe-Ito set (M. Okabe, K. Ito, "Color Universal Design", 2008, jfly.uni-koeln.de/color),
 * made to be told apart with every common colour vision. The part that gives way has the hue, the limit state
 * inside it a step of lightness, and the two-letter code always stands beside the colour.
 */
const HUES: Readonly<Record<FailingPart, string>> = {
  weld: '#D55E00',
  bolt: '#0072B2',
  plate: '#009E73',
  member: '#CC79A7',
};

/** Luminance of the darkest and the lightest step: at least 3 : 1 against the sheet of either theme. */
const RANGE = { light: [0.05, 0.25], dark: [0.24, 0.62] } as const;

export interface LimitStateColour {
  /** For a curve, a swatch or the ground of a cell. */
  readonly fill: string;
  /** For the code that stands on the fill. */
  readonly text: '#000000' | '#ffffff';
}

const textOn = (fill: string): LimitStateColour['text'] =>
  contrast(fill, '#000000') > contrast(fill, '#ffffff') ? '#000000' : '#ffffff';

/** The colour of each limit state of a kind, by id. `part` is one of the four failing parts. */
export function limitStateColours(
  limitStates: readonly { readonly id: string; readonly part: string }[],
  dark: boolean,
): ReadonlyMap<string, LimitStateColour> {
  const [low, high] = RANGE[dark ? 'dark' : 'light'];
  const colourOf = ({ id, part }: { id: string; part: string }): [string, LimitStateColour] => {
    const family = limitStates.filter((other) => other.part === part);
    const step = family.findIndex((other) => other.id === id);
    const share = family.length > 1 ? step / (family.length - 1) : 0.5;
    const fill = atLuminance(HUES[part as FailingPart] ?? '#7F7F7F', low + (high - low) * share);
    return [id, { fill, text: textOn(fill) }];
  };
  return new Map(limitStates.map(colourOf));
}
