import {
  type DetailGeometry,
  type FieldFault,
  findKind,
  NOT_COVERED,
  NOT_PERMITTED,
  type ParameterValues,
  type PreparedDetail,
  type Rejection,
  toRadians,
} from '@shared/engine/index.ts';
import { catalogue } from './gusset.ts';
import type { KindCase } from './kind-cases.ts';

/** What became of a case that holds. */
export type Ending = 'faults' | 'not-permitted' | 'not-covered' | 'capacity';

function demand(holds: boolean, what: string): void {
  if (!holds) throw new Error(what);
}

/**
 * Whatever is given ends in one of four ways, each complete: faults of named fields, rules with their numbers, a reason
 * for not being covered, or a finite positive capacity that is the least of its limit states.
 * @throws for a case that ends otherwise
 */
export function endsWell(given: KindCase): Ending {
  const kind = findKind(given.kind);
  if (kind === undefined) throw new Error(`there is no kind ${given.kind}`);
  const prepared = kind.prepare(given.values as ParameterValues, given.basis, catalogue);
  if (!prepared.ok) {
    faultsAreTold(prepared.faults);
    return 'faults';
  }
  quantitiesAreSound(prepared.detail);
  rejectionsAreTold(prepared.detail.rejections);
  const theta = toRadians(given.degrees);
  if (Number.isFinite(theta)) geometryIsFinite(prepared.detail.geometry(theta));
  return outcomeIsWhole(prepared.detail, given);
}

function faultsAreTold(faults: readonly FieldFault[]): void {
  demand(faults.length > 0, 'refused without a fault');
  for (const { field, value, message } of faults) {
    demand(field !== '' && field.length <= 60, `a fault of the field "${field}"`);
    demand(message.length > 10 && message.length < 500, `${field}: "${message.slice(0, 600)}"`);
    demand(!/\b(NaN|undefined)\b/.test(message.replace(/"[^"]*"/g, '')) || value === 'NaN', message);
    demand(JSON.stringify(value ?? null).length < 300, `${field} repeats a long value`);
  }
}

function rejectionsAreTold(rejections: readonly Rejection[]): void {
  for (const { rule, message, clause, value, limit } of rejections) {
    demand(message.length > 10 && clause !== '', `${rule} says nothing`);
    demand(Number.isFinite(value) && Number.isFinite(limit), `${rule}: ${value} beside ${limit}`);
    demand(!/NaN|Infinity|undefined/.test(message), `${rule}: ${message}`);
  }
}

function quantitiesAreSound({ quantities }: PreparedDetail): void {
  const { mass, boltCount, weldVolume } = quantities;
  demand(Number.isFinite(mass) && mass > 0, `mass ${mass}`);
  demand(Number.isInteger(boltCount) && boltCount > 0, `${boltCount} bolts`);
  demand(Number.isFinite(weldVolume) && weldVolume >= 0, `weld volume ${weldVolume}`);
}

function geometryIsFinite(drawn: DetailGeometry): void {
  const points = [
    ...drawn.outline,
    ...drawn.holes.map(({ centre }) => centre),
    ...drawn.welds.flatMap(({ from, to }) => [from, to]),
    ...drawn.member.flatMap(({ outline }) => outline),
    ...(drawn.bolts ?? []).flatMap(({ from, to }) => [from, to]),
    ...drawn.dimensions.flatMap(({ from, to }) => [from, to]),
    ...(drawn.views ?? []).flatMap(({ parts }) => parts.flatMap(({ outline }) => outline)),
    drawn.axis.from,
    drawn.axis.to,
  ];
  demand(
    points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y)),
    'a point of the drawing is not finite',
  );
}

function outcomeIsWhole(detail: PreparedDetail, { degrees, sense }: KindCase): Ending {
  const theta = toRadians(degrees);
  const out = new Float64Array(detail.limitStates.length);
  const index = detail.at(theta, sense, out);
  const outcome = detail.outcome(theta, sense);
  if (index < 0) {
    const expected = index === NOT_PERMITTED ? 'not-permitted' : 'not-covered';
    demand(index === NOT_PERMITTED || index === NOT_COVERED, `governing index ${index}`);
    demand(outcome.status === expected, `at() says ${expected}, outcome() ${outcome.status}`);
    if (outcome.status === 'not-permitted') {
      demand(outcome.rejections.length > 0, 'not permitted without a rule');
      rejectionsAreTold(outcome.rejections);
    } else if (outcome.status === 'not-covered')
      demand(outcome.reason.length > 10, 'not covered without a reason');
    return expected;
  }
  const governing = out[index] ?? NaN;
  demand(
    out.every((capacity) => capacity > 0),
    `a limit state has ${String(out.find((capacity) => !(capacity > 0)))} N`,
  );
  demand(Number.isFinite(governing), `the governing capacity is ${governing}`);
  demand(governing <= Math.min(...out) * (1 + 1e-8), 'the governing limit state is not the least');
  demand(outcome.status === 'capacity' && outcome.capacity === governing, 'outcome() has another capacity');
  sheetIsTheSame(detail, theta, { sense }, out);
  return 'capacity';
}

/** The recorder changes no number, and writes none that is not finite. */
function sheetIsTheSame(
  detail: PreparedDetail,
  theta: number,
  { sense }: Pick<KindCase, 'sense'>,
  out: Float64Array,
): void {
  const sheet = detail.record(theta, sense);
  detail.limitStates.forEach(({ id, code }, position) => {
    const last = sheet.find((section) => section.id === id)?.lines.at(-1);
    const capacity = out[position] ?? NaN;
    demand(
      last?.value === (capacity === Infinity ? 'does not apply' : capacity / 1000),
      `${code}: the sheet has ${String(last?.value)}, the sweep ${capacity / 1000} kN`,
    );
  });
  for (const { title, lines } of sheet) {
    for (const { symbol, value } of lines) {
      demand(typeof value === 'string' || Number.isFinite(value), `${title}: ${symbol} = ${value}`);
    }
  }
}
