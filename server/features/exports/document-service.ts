import type { ExportRequest } from '@shared/contracts/exports.ts';
import { ruleLegend } from '@shared/engine/sweep/index.ts';
import type { App } from '../../context.ts';
import { sheetName } from '../../documents/xlsx/text.ts';
import type { TableDocument, TableSheet } from '../../documents/xlsx/types.ts';
import type { SignedInPerson } from '../../http/route.ts';
import {
  cautionsOf,
  derivedParametersOf,
  fixedParametersOf,
  limitStatesOf,
  notesOf,
  rulesOf,
  type SweptRevision,
} from '../results/service.ts';
import { peopleOf } from '../revisions/service.ts';
import { readSettings } from '../settings/service.ts';
import { combinations, layOutTable, type TableLayout } from './layout.ts';
import { SheetRows } from './rows.ts';
import { decimalsOf, holdsOf, nameOf, shownValue, titleLines, titleOf, warningText } from './wording.ts';

/**
 * Everything that a file of tables shows.
 * @throws {ProblemError} validation
 */
export async function documentOf(
  app: App,
  person: SignedInPerson,
  swept: SweptRevision,
  request: ExportRequest,
): Promise<TableDocument> {
  const layout = layOutTable(swept, request);
  const { row, family, summary } = swept;
  const { firm } = await readSettings(app);
  const now = app.clock.now();
  const rules = await rulesOf(app, swept);
  return {
    warning: warningText(swept),
    heading: `${family.code} ${family.title}`,
    firm,
    titleLines: titleLines(swept, request, await namesOf(app, person, swept), now),
    paper: request.paper,
    footer: {
      left: `${family.code} revision ${row.letter} (${row.state})`,
      centre: row.contentHash?.slice(0, 12) ?? '',
    },
    decimals: decimalsOf(summary.increment),
    created: now,
    sheets: sheetsOf(app, swept, layout, request),
    limitStates: limitStatesOf(swept),
    rules: ruleLegend(swept.kind, swept.definition.rules).map(({ title }, index) => ({
      number: index + 1,
      title,
      clause: rules[index]?.clause ?? '',
    })),
    cautions: cautionsOf(swept),
    // Nothing of an export is worked out anew: the cells are those that were published.
    notes: notesOf({ ...swept, current: true }),
    facts: factsOf(swept),
  };
}

async function namesOf(app: App, person: SignedInPerson, { row }: SweptRevision) {
  const names = await peopleOf(app, [row.authorId, row.checkerId, row.publisherId]);
  const name = (id: number | null) => (id === null ? '' : (names.get(id)?.name ?? ''));
  return {
    author: name(row.authorId),
    checker: name(row.checkerId),
    publisher: name(row.publisherId),
    drafter: person.name,
  };
}

function sheetsOf(
  app: App,
  swept: SweptRevision,
  layout: TableLayout,
  { sense }: ExportRequest,
): TableSheet[] {
  const codes = swept.kind.limitStates.map(({ code }) => code);
  const { down, across } = layout;
  return [...combinations(layout.sheets)].map((place, index) => ({
    name: sheetName(index + 1, nameOf(swept, layout, place)),
    holds: holdsOf(swept, layout, place),
    down: down.map(titleOf),
    across: {
      title: titleOf(across),
      values: across.values.map((value) => shownValue(swept, across.name, value)),
    },
    rows: () => new SheetRows(app, swept, layout, codes, place, sense).read(),
  }));
}

function factsOf(swept: SweptRevision): TableDocument['facts'] {
  const { row, definition, engineVersion, basis } = swept;
  const { gammaM0, gammaM1, gammaM2 } = definition.factors;
  return [
    ['Hash of the revision, SHA-256', row.contentHash ?? '', ''],
    ['Engine version', engineVersion, ''],
    ['Design basis', basis.title, ''],
    ['Increment, rounded down', swept.summary.increment, 'kN'],
    ...(basis.hasPartialFactors
      ? ([
          ['Partial factor γM0', gammaM0, ''],
          ['Partial factor γM1', gammaM1, ''],
          ['Partial factor γM2', gammaM2, ''],
        ] as const)
      : []),
    ...fixedParametersOf(swept).map(
      ({ name, label, unit, value }) => [label, shownValue(swept, name, value), unit] as const,
    ),
    ...derivedParametersOf(swept).map(
      ({ label, unit, expression }) => [`${label}, derived`, expression, unit] as const,
    ),
    ...(definition.rules ?? []).map(
      ({ expression, message }, index) =>
        [`Rule ${index + 1} of the family: ${message}`, expression, ''] as const,
    ),
  ];
}
