import type { LimitStateColour } from '../../styles/limit-states.ts';
import { heatOf } from './heat.ts';
import { cellText, spokenReading, type CellReading } from './reading.ts';

/** The ends of the heat map, kN; null while it is off. */
export interface HeatRange {
  readonly lowest: number;
  readonly highest: number;
  readonly dark: boolean;
}

/** A cell as it stands in the table. */
export interface ShownCell {
  readonly column: number;
  readonly text: string;
  readonly code: string;
  readonly colour: LimitStateColour | undefined;
  readonly ground: string | undefined;
  readonly spoken: string;
  readonly rejected: boolean;
}

export function shownCell(
  column: number,
  reading: CellReading,
  increment: number,
  colours: ReadonlyMap<string, LimitStateColour>,
  heat: HeatRange | null,
): ShownCell {
  const governing = reading.status === 'capacity' ? reading.governing : null;
  return {
    column,
    text: cellText(reading, increment),
    code: governing?.code ?? '',
    colour: governing ? colours.get(governing.id) : undefined,
    ground:
      heat && reading.status === 'capacity'
        ? heatOf(reading.capacity, heat.lowest, heat.highest, heat.dark)
        : undefined,
    spoken: spokenReading(reading, increment),
    rejected: reading.status === 'rejected',
  };
}
