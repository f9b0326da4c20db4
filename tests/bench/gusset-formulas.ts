import { angles, fixed, type Row, rows } from './gusset-table.ts';

/** One column of the sheet: its name, and its formula from the letters of other columns in the same row. */
interface Column {
  readonly name: string;
  readonly formula: (at: (name: string) => string) => string;
}

const { fy, fu, weldLength: L, firstRow, gussetEnd, gussetEdge, memberEnd, hole, d, stressArea, fub } = fixed;
const { legThickness, legArea, toe } = fixed;
/** γM2 stands in a cell of its own, which every row refers to: changing it recalculates the whole table. */
const M2 = 'F!$A$1';

/** Distance across the axis from it to a side of the plate, at a distance s along the axis. */
const side = (sign: string, s: string, at: (name: string) => string) => {
  const from = `(${sign}${L / 2}*${at('sin')})`;
  const rise = `(${gussetEdge}-${L / 2}*${at('cos')})`;
  return `(${L / 2}*${at('cos')}+${rise}*(${s}-${from})/(${at('cut')}-${from}))`;
};
const bearing = (t: string, k1: string, alpha: string) => `${k1}*${alpha}*${fu}*${d}*${t}/${M2}`;
const group = (ahead: string, behind: string, at: (name: string) => string) =>
  `=IF(2*${at('bolt')}>=MAX(${ahead},${behind}),${ahead}+(${at('n')}-1)*${behind},${at('n')}*MIN(${ahead},${behind}))`;
const block = (t: string, width: string, length: string, at: (name: string) => string) =>
  `0.5*${fu}*${t}*(${width}-${hole / 2})/${M2}+${fy}*${t}*(${length}-(${at('n')}-0.5)*${hole})/SQRT(3)`;
const alphaB = (share: string) => `MIN(${share},${fub / fu},1)`;

/** EN 1993-1-8 and EN 1993-1-1 by the clauses of the gusset plate's calculation sheet, written as in a spreadsheet. */
const columns: readonly Column[] = [
  { name: 'cos', formula: (at) => `=COS(RADIANS(${at('angle')}))` },
  { name: 'sin', formula: (at) => `=SIN(RADIANS(${at('angle')}))` },
  { name: 'last', formula: (at) => `=${firstRow}+(${at('n')}-1)*${at('p')}` },
  { name: 'cut', formula: (at) => `=${at('last')}+${gussetEnd}` },
  { name: 'upper', formula: (at) => `=${side('', String(firstRow), at)}` },
  { name: 'lower', formula: (at) => `=${side('-', String(firstRow), at)}` },
  { name: 'beside', formula: (at) => `=MIN(${side('', at('last'), at)},${side('-', at('last'), at)})` },
  { name: 'sigma', formula: (at) => `=${at('cos')}/(2*${L})/${at('z')}` },
  { name: 'tau', formula: (at) => `=${at('sin')}/(2*${L})*SQRT(2)/${at('z')}` },
  {
    name: 'WM',
    formula: (at) =>
      `=MIN(${fu}/(0.9*${M2})/SQRT(4*${at('sigma')}^2+3*${at('tau')}^2),0.9*${fu}/${M2}/${at('sigma')})`,
  },
  { name: 'PW', formula: (at) => `=${fy}*${at('t')}*${L}/SQRT(${at('cos')}^2+3*${at('sin')}^2)` },
  { name: 'bolt', formula: () => `=0.6*${fub}*${stressArea}/${M2}` },
  { name: 'BS', formula: (at) => `=2*${at('n')}*${at('bolt')}` },
  { name: 'k1', formula: (at) => `=MIN(2.8*${at('beside')}/${hole}-1.7,2.5)` },
  {
    name: 'GB',
    formula: (at) =>
      group(
        bearing(at('t'), at('k1'), alphaB(String(gussetEnd / (3 * hole)))),
        bearing(at('t'), at('k1'), alphaB(`${at('p')}/${3 * hole}-0.25`)),
        at,
      ),
  },
  {
    name: 'MB',
    formula: (at) => {
      const k1 = `MIN(2.8*${toe}/${hole}-1.7,2.5)`;
      const t = String(2 * legThickness);
      return group(
        bearing(t, k1, alphaB(String(memberEnd / (3 * hole)))),
        bearing(t, k1, alphaB(`${at('p')}/${3 * hole}-0.25`)),
        at,
      );
    },
  },
  {
    name: 'GX',
    formula: (at) => {
      const length = `((${at('n')}-1)*${at('p')}+${gussetEnd})`;
      return `=${block(at('t'), `MIN(${at('upper')},${at('lower')})`, length, at)}`;
    },
  },
  {
    name: 'MX',
    formula: (at) =>
      `=2*(${block(String(legThickness), String(toe), `((${at('n')}-1)*${at('p')}+${memberEnd})`, at)})`,
  },
  {
    name: 'width',
    formula: (at) => {
      const spread = `(${at('n')}-1)*${at('p')}*TAN(PI()/6)`;
      return `=MIN(${spread},${at('upper')})+MIN(${spread},${at('lower')})`;
    },
  },
  {
    name: 'WH',
    formula: (at) =>
      `=MIN(${at('t')}*${at('width')}*${fy},0.9*${at('t')}*(${at('width')}-${hole})*${fu}/${M2})`,
  },
  {
    name: 'MN',
    formula: (at) => {
      const share = `MAX(0,MIN(1,(${at('p')}/${hole}-2.5)/2.5))`;
      const beta = `IF(${at('n')}=2,0.4+0.3*${share},0.5+0.2*${share})`;
      return `=2*${beta}*${legArea - hole * legThickness}*${fu}/${M2}`;
    },
  },
  { name: 'MY', formula: () => `=2*${legArea}*${fy}` },
  {
    name: 'capacity',
    formula: (at) =>
      `=MIN(${['WM', 'PW', 'BS', 'GB', 'MB', 'GX', 'MX', 'WH', 'MN', 'MY'].map((name) => at(name)).join(',')})`,
  },
];

const names = ['t', 'z', 'n', 'p', 'angle', ...columns.map(({ name }) => name)];
const letterOf = (name: string) => String.fromCharCode(65 + (names.indexOf(name) % 26));
const prefixOf = (name: string) => (names.indexOf(name) >= 26 ? 'A' : '');

/** Column of the sheet that holds the capacity, from 0. */
export const capacityColumn = names.indexOf('capacity');

/** The rows of the sheet, one for each cell of the table: inputs, then formulas. */
export function sheetRows(): (number | string)[][] {
  const inputs = rows.flatMap((row: Row) => angles.map((angle) => ({ ...row, angle })));
  return inputs.map(({ t, z, n, p, angle }, index) => {
    const at = (name: string) => `${prefixOf(name)}${letterOf(name)}${index + 1}`;
    return [t, z, n, p, angle, ...columns.map(({ formula }) => formula(at))];
  });
}
