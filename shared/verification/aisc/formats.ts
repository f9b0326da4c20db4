import { asd, available, type FactorPair, lrfd } from '../../engine/standards/aisc-360-2022/index.ts';
import { type Check, printed, type RoundedFirst, threeFigures } from '../check.ts';

export const COMPANION =
  'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, v16.0 (AISC 2023)';
export const MANUAL = 'AISC Steel Construction Manual';

/** What a set of rows has in common. */
export interface Given {
  readonly state: string;
  readonly clause: string;
  readonly source: string;
  readonly inputs: string;
  readonly unit: string;
  /** Known from memory; otherwise found in text. */
  readonly memory?: boolean;
}

type AiscId = 'aisc-360-2022-lrfd' | 'aisc-360-2022-asd';

/** Collects rows under one prefix; ids count up. */
export class Rows {
  readonly list: Check[] = [];

  constructor(private readonly prefix: string) {}

  /** A nominal value or a factor, the same in both formats: listed under LRFD. */
  value(given: Given, text: string, ours: () => number): void {
    this.add(given, 'aisc-360-2022-lrfd', text, ours);
  }

  /** The design and the allowable strength of one nominal strength. */
  both(
    given: Given,
    pair: FactorPair,
    design: string,
    allowable: string | null,
    nominal: () => number,
    rounded: { readonly lrfd?: RoundedFirst; readonly asd?: RoundedFirst } = {},
  ): void {
    this.add(given, 'aisc-360-2022-lrfd', design, () => available(lrfd, nominal(), pair), rounded.lrfd);
    if (allowable === null) return;
    this.add(given, 'aisc-360-2022-asd', allowable, () => available(asd, nominal(), pair), rounded.asd);
  }

  /** One row of a format's own. */
  add(given: Given, basis: AiscId, text: string, ours: () => number, roundedFirst?: RoundedFirst): void {
    const whole = Number(text) >= 1000 && !text.includes('.');
    this.list.push({
      id: `aisc-${this.prefix}-${this.list.length + 1}`,
      basis,
      clause: `AISC 360-22 ${given.clause}`,
      source: given.source,
      evidence: given.memory === true ? 'from memory' : 'found in text',
      inputs: `${given.state}: ${given.inputs}`,
      published: whole ? threeFigures(Number(text)) : printed(text),
      unit: given.unit,
      ours,
      ...(roundedFirst === undefined ? {} : { roundedFirst }),
    });
  }
}
