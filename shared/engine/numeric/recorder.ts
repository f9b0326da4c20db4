import type { Recorder, SheetLine, SheetSection } from '../types.ts';
import { toDegrees } from './units.ts';

/** How an engine unit is written on a sheet. */
const atTheEdge: Readonly<Record<string, { unit: string; convert: (value: number) => number }>> = {
  N: { unit: 'kN', convert: (value) => value / 1000 },
  'N/mm': { unit: 'kN/mm', convert: (value) => value / 1000 },
  'N/mm per N': { unit: 'N/mm per kN', convert: (value) => value * 1000 },
  'MPa per N': { unit: 'MPa per kN', convert: (value) => value * 1000 },
  'N·mm': { unit: 'kN·m', convert: (value) => value / 1e6 },
  rad: { unit: '°', convert: toDegrees },
};

/** Collects the lines of a calculation sheet, turning engine units into those of the sheet. */
export class SheetRecorder implements Recorder {
  readonly sections: SheetSection[] = [];

  section(id: string, title: string): void {
    this.sections.push({ id, title, lines: [] });
  }

  line(
    symbol: string,
    meaning: string,
    formula: string,
    value: number | string,
    unit: string,
    clause: string,
  ): void {
    const edge = atTheEdge[unit];
    const line: SheetLine =
      edge !== undefined && typeof value === 'number'
        ? { symbol, meaning, formula, value: edge.convert(value), unit: edge.unit, clause }
        : { symbol, meaning, formula, value, unit, clause };
    const last = this.sections.at(-1);
    if (last === undefined) throw new Error('A line was recorded before its section was opened');
    last.lines.push(line);
  }
}
