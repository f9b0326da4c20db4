import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import {
  type BasisInfo,
  bases,
  type DetailKind,
  kinds,
  type ParameterValues,
  type PreparedDetail,
  toRadians,
} from '@shared/engine/index.ts';
import { engineCatalogue } from '@server/catalogue.ts';
import { median, timed } from './timing.ts';

const CELLS = 200_000;
const PREPARED = 2000;
const ROUNDS = 5;
const ANGLES = 61;

interface Method {
  readonly name: string;
  readonly values: ParameterValues;
}

/** The ways in which a kind's bolt group can be taken in a basis. */
function methodsOf({ parameters }: DetailKind, basis: BasisInfo): Method[] {
  const spec = parameters.find(({ name }) => name === 'bolt_group');
  const elastic = { name: 'elastic', values: {} };
  const used = spec?.choices?.some(({ value }) => value === 'centre') && basis.id !== 'en-1993-1-8-2005';
  return used ? [elastic, { name: 'instantaneous centre', values: { bolt_group: 'centre' } }] : [elastic];
}

/** The angles of the kind's range, radians; every one is permitted for the kind's default detail. */
function anglesOf({ angleRange: { minimum, maximum } }: DetailKind): Float64Array {
  return Float64Array.from({ length: ANGLES }, (_, at) =>
    toRadians(minimum + ((maximum - minimum) * at) / (ANGLES - 1)),
  );
}

function fill(detail: PreparedDetail, angles: Float64Array, out: Float64Array): number {
  let permitted = 0;
  for (let cell = 0; cell < CELLS; cell++) {
    if (detail.at(angles[cell % ANGLES]!, 'tension', out) >= 0) permitted++;
  }
  return permitted;
}

setFlagsFromString('--expose-gc');
const collectGarbage = runInNewContext('gc') as () => void;

/** Bytes that the heap grows by in a cell. */
function growth(detail: PreparedDetail, angles: Float64Array, out: Float64Array): number {
  collectGarbage();
  const before = process.memoryUsage().heapUsed;
  fill(detail, angles, out);
  return (process.memoryUsage().heapUsed - before) / CELLS;
}

function benchOne(kind: DetailKind, basis: BasisInfo, { name, values }: Method): void {
  const catalogue = engineCatalogue();
  const prepare = () => kind.prepare(values, basis.id, catalogue);
  const prepared = prepare();
  if (!prepared.ok) throw new Error(JSON.stringify(prepared.faults));
  const angles = anglesOf(kind);
  const out = new Float64Array(kind.limitStates.length);
  const permitted = fill(prepared.detail, angles, out) / CELLS;
  if (permitted < 0.5) throw new Error(`${kind.id} in ${basis.id}: the default detail is hardly permitted`);
  const seconds = median(
    Array.from({ length: ROUNDS }, () => timed(() => fill(prepared.detail, angles, out))),
  );
  for (let warm = 0; warm < PREPARED / 4; warm++) prepare();
  const preparing = timed(() => {
    for (let count = 0; count < PREPARED; count++) prepare();
  });
  const bytes = growth(prepared.detail, angles, out);
  const columns = [
    kind.id.padEnd(14),
    basis.id.padEnd(20),
    name.padEnd(21),
    (CELLS / seconds / 1e6).toFixed(2).padStart(7),
    ((preparing / PREPARED) * 1e6).toFixed(1).padStart(11),
    bytes.toFixed(0).padStart(10),
  ];
  console.log(columns.join(' '));
}

/** Prints cells a second on one thread, every limit state of each, for each kind, basis and method. */
export function benchKinds(): void {
  console.log('\nkind           basis                method                M cells/s  prepare µs bytes/cell');
  for (const kind of kinds) {
    for (const basis of bases) {
      for (const method of methodsOf(kind, basis)) benchOne(kind, basis, method);
    }
  }
}
