import { print } from './print.ts';
import { type Check, toleranceOf, verdictOf } from '@shared/verification/check.ts';
import { disagreements, notYetAnswered } from '@shared/verification/disagreements.ts';
import { checks } from '@shared/verification/registry.ts';

/*
 * npm run verification [-- --json]
 * Prints every comparison with a published value, then the known disagreements.
 * Exit status: 0 when all agree, 1 when one does not.
 */
const significant = (value: number) => String(Number(value.toPrecision(6)));

function rowOf(check: Check): readonly string[] {
  const { ours, difference, tolerance, agrees } = verdictOf(check);
  const { id, clause, evidence, published, unit, weak } = check;
  return [
    id,
    clause,
    weak === undefined ? evidence : `${evidence}, weak`,
    published.value.toFixed(Math.max(0, -Math.log10(published.place))),
    significant(ours),
    unit,
    difference.toPrecision(2),
    significant(tolerance),
    agrees ? 'agrees' : 'DIFFERS',
  ];
}

const heads = [
  'check',
  'clause',
  'evidence',
  'published',
  'ours',
  'unit',
  'difference',
  'tolerance',
  'verdict',
];
/** Columns of numbers, which stand against the right. */
const right = new Set([3, 4, 6, 7]);

function tableOf(rows: readonly (readonly string[])[]): string[] {
  const widths = heads.map((head, at) => Math.max(head.length, ...rows.map((row) => (row[at] ?? '').length)));
  return [heads, ...rows].map((row) =>
    row
      .map((cell, at) => (right.has(at) ? cell.padStart(widths[at]!) : cell.padEnd(widths[at]!)))
      .join('  ')
      .trimEnd(),
  );
}

function sectionOf(basis: string): string[] {
  const own = checks.filter((check) => check.basis === basis);
  const lines = tableOf(own.map(rowOf));
  const sources = [...new Set(own.map(({ source }) => source))];
  const remarks = own.flatMap(({ id, inputs, source, roundedFirst, weak, note }) => {
    const said = [
      ...(roundedFirst === undefined ? [] : [`rounded first: ${roundedFirst.what}`]),
      ...(weak === undefined ? [] : [`weak: ${weak}`]),
      ...(note === undefined ? [] : [note]),
    ];
    return [`  ${id} (source ${sources.indexOf(source) + 1}): ${[inputs, ...said].join('; ')}`];
  });
  const listed = sources.map((source, at) => `  ${at + 1}. ${source}`);
  return [basis, '', ...lines, '', 'Sources', ...listed, '', 'Inputs and remarks', ...remarks, ''];
}

function summary(): string {
  const count = (test: (check: Check) => boolean) => checks.filter(test).length;
  const agreeing = count((check) => verdictOf(check).agrees);
  return [
    `${checks.length} checks: ${agreeing} agree, ${checks.length - agreeing} differ.`,
    `${count(({ evidence }) => evidence === 'found in text')} found in text, ${count(({ evidence }) => evidence === 'from memory')} from memory,`,
    `${count(({ evidence }) => evidence === 'rule evaluation')} rule evaluations (no evidence from outside); ${count(({ weak }) => weak !== undefined)} of them weak.`,
    'A tolerance is half a unit of the last printed place, and what a rounded intermediate of the source explains.',
  ].join(' ');
}

function asText(): string {
  const listed = ({ id, published, reason }: (typeof disagreements)[number]) =>
    `  ${id}: ${published}. ${reason}`;
  return [
    ...[...new Set(checks.map(({ basis }) => basis))].flatMap(sectionOf),
    'Known disagreements',
    ...disagreements.map(listed),
    '',
    'Published, not yet answered',
    ...notYetAnswered.map(listed),
    '',
    summary(),
    '',
  ].join('\n');
}

function asJson(): string {
  const rows = checks.map((check) => ({
    ...check,
    ours: verdictOf(check).ours,
    tolerance: toleranceOf(check),
    agrees: verdictOf(check).agrees,
  }));
  return `${JSON.stringify({ checks: rows, disagreements, notYetAnswered })}\n`;
}

print(process.argv[2] === '--json' ? asJson() : asText());
process.exitCode = checks.every((check) => verdictOf(check).agrees) ? 0 : 1;
