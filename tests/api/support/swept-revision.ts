import type { Definition } from '@shared/contracts/definition.ts';
import type { RevisionState } from '@shared/contracts/common.ts';
import { ENGINE_VERSION } from '@shared/engine/index.ts';
import { RULE_CODE, ruleLegend } from '@shared/engine/sweep/index.ts';
import type { ResultSummary, RevisionRow } from '@server/database/models/revision.ts';
import { layOut, type CheckedDefinition } from '@server/features/families/definition-service.ts';
import { canonicalJson } from '@server/canonical-json.ts';
import sweepTask, { type PackedVariant } from '@server/jobs/sweep-worker.ts';
import type { Harness } from '../harness.ts';
import { smallDefinition } from './definition.ts';

export interface Wanted {
  code: string;
  title?: string;
  definition?: Definition;
  state?: RevisionState;
  engineVersion?: string;
}

/** A revision as a sweep would have left it, brought to the state wanted; no queue, no HTTP. */
export interface Made {
  row: RevisionRow;
  familyId: number;
  laidOut: CheckedDefinition;
  variants: PackedVariant[];
  /** kN as stored, NaN where there is none. */
  stored(ordinal: number, sense: number, angle: number): number;
  code(ordinal: number, sense: number, angle: number): number;
}

function summaryOf({ definition, kind, grid }: CheckedDefinition, variants: PackedVariant[]): ResultSummary {
  const codes = variants.flatMap(({ governing }) => [...governing]);
  const kilonewtons = variants
    .flatMap(({ capacities }) => [...new Float32Array(capacities.slice().buffer)])
    .filter((capacity) => !Number.isNaN(capacity));
  const { axes, angles, senses } = grid;
  return {
    axes,
    angles,
    senses,
    increment: definition.increment,
    lowest: Math.min(...kilonewtons),
    highest: Math.max(...kilonewtons),
    rejected: ruleLegend(kind, definition.rules)
      .map(({ id }, index) => ({
        rule: id,
        cells: codes.filter((code) => code === RULE_CODE - index).length,
      }))
      .filter(({ cells }) => cells > 0),
  };
}

/** The trigger rules let a revision through its life one step at a time. */
async function bringTo(harness: Harness, row: RevisionRow, state: RevisionState): Promise<void> {
  const { engineer, admin } = harness.people;
  const now = harness.clock.now();
  const steps: [RevisionState, Partial<RevisionRow>][] = [
    ['in-check', { submittedAt: now }],
    ['checked', { checkerId: engineer.id, checkedAt: now }],
    [
      'published',
      { letter: 'A', contentHash: 'c0ffee'.padEnd(64, '0'), publisherId: row.authorId, publishedAt: now },
    ],
  ];
  const last: Partial<Record<RevisionState, Partial<RevisionRow>>> = {
    locked: { lockerId: admin.id, lockedAt: now },
    superseded: {},
    withdrawn: { withdrawnReason: 'The end distance was wrong.' },
  };
  if (last[state]) steps.push([state, last[state]]);
  const until = steps.findIndex(([name]) => name === state);
  for (const [name, stamps] of steps.slice(0, until + 1)) await row.update({ ...stamps, state: name });
}

/** Makes a family with one swept revision. */
export async function makeSwept(harness: Harness, wanted: Wanted): Promise<Made> {
  const { code, title = 'Gusset', definition = smallDefinition, state = 'published' } = wanted;
  const laidOut = layOut(canonicalJson(definition));
  const { grid, text, hash, kind } = laidOut;
  const { Family, Revision, Variant } = harness.db.models;
  const family = await Family.create({ code, title, kind: kind.id });
  const authorId = harness.people['standards-manager'].id;
  const row = await Revision.create({
    familyId: family.id,
    sequence: 1,
    definition: text,
    definitionHash: hash,
    authorId,
  });
  const plan = { number: 0, firstOrdinal: 0, variantCount: grid.variantCount };
  const variants = sweepTask({ ...plan, definition: text });
  const packed = variants.map(({ capacities, governing, ...facts }) => ({
    revisionId: row.id,
    ...facts,
    capacities: Buffer.from(capacities),
    governing: Buffer.from(governing),
  }));
  await Variant.bulkCreate(packed);
  const resultSummary = summaryOf(laidOut, variants);
  const { variantCount, cellCount } = grid;
  const rejectedCells = resultSummary.rejected.reduce((sum, { cells }) => sum + cells, 0);
  const engineVersion = wanted.engineVersion ?? ENGINE_VERSION;
  const counts = { variantCount, cellCount, rejectedCells };
  await row.update({ state: 'swept', engineVersion, resultSummary, ...counts });
  await bringTo(harness, row, state);
  const place = (sense: number, angle: number) => sense * grid.angles.length + angle;
  return {
    row,
    familyId: family.id,
    laidOut,
    variants,
    stored: (ordinal, sense, angle) => packed[ordinal]!.capacities.readFloatLE(4 * place(sense, angle)),
    code: (ordinal, sense, angle) => packed[ordinal]!.governing[place(sense, angle)]!,
  };
}
