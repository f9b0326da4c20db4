import type { Sheet } from '@shared/contracts/revisions.ts';
import { findKind } from '@shared/engine/index.ts';
import { fixed, upTo } from '../../composables/format.ts';
import { unitAfter, valueTitle } from '../../composables/value-title.ts';

/** Groups of given parameters, in the order in which a detail is built. */
const GROUPS: readonly (readonly [string, string])[] = [
  ['support', 'Support'],
  ['plate', 'Plate'],
  ['cleat', 'Cleats'],
  ['weld', 'Weld'],
  ['bolts', 'Bolts'],
  ['member', 'Connected member'],
  ['beam', 'Supported beam'],
  ['method', 'Method'],
];

export interface GivenLine {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly value: string;
  readonly unit: string;
  /** What a derived value follows from. */
  readonly expression: string | null;
}

/** The given parameters by group; a group that this page does not know comes last under its own name. */
export function givenGroups(parameters: Sheet['parameters'], kind: string) {
  const known = GROUPS.map(([id]) => id);
  const others = [...new Set(parameters.map(({ group }) => group))].filter((id) => !known.includes(id));
  const groups = [...GROUPS, ...others.map((id) => [id, id] as const)];
  return groups
    .map(([id, title]) => ({
      id,
      title,
      lines: parameters
        .filter(({ group }) => group === id)
        .map(({ name, label, symbol, unit, value, expression }): GivenLine => ({
          name,
          label,
          symbol,
          unit: unitAfter(kind, name, value, unit),
          value: valueTitle(kind, name, value),
          expression,
        })),
    }))
    .filter(({ lines }) => lines.length > 0);
}

/**
 * A value of the working to four significant figures at least, without false decimals: 0.04321, 12.35, 1 234.5.
 * Text stands as it is.
 */
export function workingValue(value: number | string): string {
  if (typeof value === 'string') return value;
  const size = Math.abs(value);
  if (size === 0) return '0';
  if (size < 1e-3) return value.toExponential(3).replace('-', '−').replace('e−', ' × 10^−');
  if (size >= 1000) return upTo(value, 1);
  return upTo(value, size >= 100 ? 2 : size >= 1 ? 3 : 5);
}

/** kN to one decimal, cut off rather than rounded up, so that no printed capacity is above the computed one. */
export const printedCapacity = (capacity: number): string => fixed(Math.floor(capacity * 10 + 1e-9) / 10, 1);

export interface SummaryLine {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly capacity: number | null;
  readonly clause: string;
  readonly governing: boolean;
  /** Times the lowest capacity; null where the limit state does not apply. */
  readonly ratio: number | null;
}

/** Every limit state of the sheet with its capacity; the governing one is marked. */
export function summaryOf({ sections, outcome }: Pick<Sheet, 'sections' | 'outcome'>): SummaryLine[] {
  const lowest = outcome.status === 'capacity' ? outcome.capacity : null;
  return sections.flatMap(({ id, code, title, capacity, lines }) =>
    code === null
      ? []
      : [
          {
            id,
            code,
            title,
            capacity,
            clause: lines.findLast(({ clause }) => clause !== '')?.clause ?? '',
            governing:
              outcome.status === 'capacity' && (outcome.governing === id || outcome.governing === code),
            ratio: capacity !== null && lowest ? capacity / lowest : null,
          },
        ],
  );
}

/** The limit states of the sheet with the part that gives way, in the order of the kind, for their colours. */
export function limitStatesOf({ sections }: Pick<Sheet, 'sections'>, kind: string) {
  const known = findKind(kind)?.limitStates ?? [];
  const others = sections.filter(({ id, code }) => code !== null && !known.some((state) => state.id === id));
  return [...known, ...others.map(({ id }) => ({ id, part: '' }))];
}

/** The sections of the working, without the lines that only repeat a given parameter. */
export function workingSections({ sections, parameters }: Pick<Sheet, 'sections' | 'parameters'>) {
  const given = new Set(parameters.map(({ label }) => label));
  return sections
    .map((section) =>
      section.code === null
        ? {
            ...section,
            lines: section.lines.filter(({ meaning, formula }) => formula || !given.has(meaning)),
          }
        : section,
    )
    .filter(({ code, lines }) => code !== null || lines.length > 0);
}
