import { refuseIf, type Migration } from './migration.ts';

/** What publication freezes. */
const frozen = [
  'id',
  'family_id',
  'sequence',
  'letter',
  'definition',
  'definition_hash',
  'engine_version',
  'content_hash',
  'variant_count',
  'cell_count',
  'rejected_cells',
  'author_id',
  'checker_id',
  'publisher_id',
  'submitted_at',
  'checked_at',
  'published_at',
  'result_summary',
  'created_at',
];
const text = new Set(['letter', 'definition', 'definition_hash', 'engine_version', 'content_hash']);

/** Text is compared as bytes, since a collation takes different text for equal. */
const changed = (column: string): string =>
  text.has(column) || column === 'result_summary'
    ? `NOT (BINARY OLD.${column} <=> BINARY NEW.${column})`
    : `NOT (OLD.${column} <=> NEW.${column})`;
const anyChanged = (columns: readonly string[]): string => `(${columns.map(changed).join(' OR ')})`;

const issued = "OLD.state IN ('published', 'locked', 'superseded', 'withdrawn')";
const moves = [
  "(OLD.state = 'published' AND NEW.state IN ('locked', 'superseded', 'withdrawn'))",
  "(OLD.state = 'locked' AND NEW.state IN ('superseded', 'withdrawn'))",
];

const updateRules = [
  refuseIf(`${issued} AND ${anyChanged(frozen)}`, 'a published revision cannot be changed'),
  refuseIf(
    `${issued} AND OLD.state <> NEW.state AND NOT (${moves.join(' OR ')})`,
    'a published revision cannot go back',
  ),
  refuseIf(
    `${issued} AND ${anyChanged(['locker_id', 'locked_at'])} AND NOT (OLD.state = 'published' AND NEW.state = 'locked')`,
    'only locking writes who locked a revision',
  ),
  refuseIf(
    `${issued} AND ${changed('withdrawn_reason')} AND NOT (OLD.state <> 'withdrawn' AND NEW.state = 'withdrawn')`,
    'only withdrawing writes a reason',
  ),
  refuseIf(
    "NEW.state IN ('locked', 'superseded', 'withdrawn') AND OLD.state IN ('draft', 'swept', 'in-check', 'checked')",
    'a revision is published before anything else becomes of it',
  ),
  refuseIf(
    "NEW.state = 'published' AND OLD.state NOT IN ('checked', 'published')",
    'a revision is checked before it is published',
  ),
  refuseIf(
    "NEW.state = 'published' AND (NEW.letter IS NULL OR NEW.content_hash IS NULL OR NEW.checker_id IS NULL OR NEW.publisher_id IS NULL OR NEW.published_at IS NULL)",
    'a published revision names letter, hash, checker, publisher and time',
  ),
  refuseIf(
    `OLD.state IN ('in-check', 'checked') AND NEW.state <> 'draft' AND ${anyChanged(['definition', 'definition_hash', 'engine_version', 'variant_count', 'cell_count', 'rejected_cells', 'result_summary', 'author_id'])}`,
    'a revision in check cannot be changed',
  ),
];

export const revisionTriggers: Migration = {
  name: '015-revision-triggers',
  up: [
    `CREATE TRIGGER revisions_born_draft BEFORE INSERT ON revisions FOR EACH ROW BEGIN ${refuseIf(
      "NEW.state <> 'draft'",
      'a revision begins as a draft',
    )} END`,
    `CREATE TRIGGER revisions_frozen BEFORE UPDATE ON revisions FOR EACH ROW BEGIN ${updateRules.join('\n')} END`,
    `CREATE TRIGGER revisions_kept BEFORE DELETE ON revisions FOR EACH ROW BEGIN ${refuseIf(
      "OLD.state NOT IN ('draft', 'swept')",
      'a revision that was submitted is kept',
    )} END`,
  ],
  down: ['revisions_kept', 'revisions_frozen', 'revisions_born_draft'].map((name) => `DROP TRIGGER ${name}`),
};
