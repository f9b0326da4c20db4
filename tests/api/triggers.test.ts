import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { createPool } from '@server/database/sequelize.ts';
import { createHarness, type Harness } from './harness.ts';

let harness: Harness;
let family = 0;
let revision = 0;

const sql = (text: string, values: Record<string, unknown> = {}) =>
  harness.db.execute(text, { id: revision, ...values });
const hash = 'a'.repeat(64);
const hex = "X'0000803F'";

beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());

/** A draft with two variants. */
beforeEach(async () => {
  const { Family, Revision } = harness.db.models;
  const code = `GP-${String(10 + family).padStart(2, '0')}`;
  family += 1;
  const { id } = await Family.create({ code, title: 'Gusset', kind: 'gusset-plate' });
  const made = await Revision.create({
    familyId: id,
    sequence: 1,
    definition: '{"a":1}',
    definitionHash: hash,
    authorId: harness.people['standards-manager'].id,
  });
  revision = made.id;
  await addVariant(0);
  await addVariant(1);
});

const addVariant = (ordinal: number) =>
  sql(
    `INSERT INTO variants (revision_id, ordinal, params_hash, params, mass, bolt_count, weld_volume, lowest, capacities, governing)
     VALUES (:id, :ordinal, :key, '{"pitch":70}', 3.5, 4, 1200, 1, ${hex}, X'02')`,
    { ordinal, key: `${ordinal}`.padStart(32, '0') },
  );

/** Moves the revision along its life, up to and including the state. */
async function bringTo(state: string): Promise<void> {
  const { engineer, admin } = harness.people;
  const steps: [string, string, Record<string, unknown>][] = [
    [
      'swept',
      "state = 'swept', engine_version = '1', variant_count = 2, cell_count = 2, rejected_cells = 0",
      {},
    ],
    ['in-check', "state = 'in-check', submitted_at = NOW(3)", {}],
    ['checked', "state = 'checked', checker_id = :person, checked_at = NOW(3)", { person: engineer.id }],
    [
      'published',
      "state = 'published', letter = 'A', content_hash = :hash, publisher_id = author_id, published_at = NOW(3)",
      { hash },
    ],
    ['locked', "state = 'locked', locker_id = :person, locked_at = NOW(3)", { person: admin.id }],
  ];
  for (const [name, change, values] of steps) {
    expect(await sql(`UPDATE revisions SET ${change} WHERE id = :id`, values)).toBe(1);
    if (name === state) return;
  }
}

const refused = async (text: string, values: Record<string, unknown> = {}) => {
  await expect(sql(text, values), text).rejects.toMatchObject({
    original: { errno: 1644, sqlMessage: expect.stringContaining('RECORD_LOCKED: ') as string },
  });
};

const rowChanges = [
  "UPDATE variants SET capacities = X'00000000' WHERE revision_id = :id AND ordinal = 0",
  'UPDATE variants SET mass = mass + 1 WHERE revision_id = :id',
  'DELETE FROM variants WHERE revision_id = :id AND ordinal = 1',
  `INSERT INTO variants SELECT revision_id, 2, REPEAT('2', 32), params, mass, bolt_count, weld_volume, lowest, capacities, governing
     FROM variants WHERE revision_id = :id AND ordinal = 0`,
  `REPLACE INTO variants SELECT revision_id, ordinal, params_hash, params, 99, bolt_count, weld_volume, lowest, capacities, governing
     FROM variants WHERE revision_id = :id AND ordinal = 0`,
  `INSERT INTO variants (revision_id, ordinal, params_hash, params, mass, bolt_count, weld_volume, capacities, governing)
     VALUES (:id, 0, REPEAT('0', 32), '{}', 9, 9, 9, ${hex}, X'02') ON DUPLICATE KEY UPDATE mass = 9`,
  'UPDATE variants JOIN revisions ON revisions.id = variants.revision_id SET variants.mass = 9 WHERE revisions.id = :id',
  'DELETE variants FROM variants JOIN revisions ON revisions.id = variants.revision_id WHERE revisions.id = :id',
];

const frozenChanges = [
  'definition = \'{"a":2}\'',
  'definition = \'{"A":1}\'',
  'definition = \'{"a":1} \'',
  "definition_hash = REPEAT('b', 64)",
  "content_hash = REPEAT('b', 64)",
  "letter = 'B'",
  "engine_version = '2'",
  'variant_count = 3',
  'cell_count = 3',
  'rejected_cells = 1',
  'sequence = 9',
  'author_id = author_id + 1',
  'checker_id = NULL',
  'publisher_id = NULL',
  'published_at = NULL',
  "result_summary = '{}'",
  "state = 'draft'",
  "state = 'swept'",
  "state = 'in-check'",
  "state = 'checked'",
];

describe.each(['published', 'locked'])('a %s revision', (state) => {
  beforeEach(() => bringTo(state));

  test.each(rowChanges)('refuses %s', (change) => refused(change));
  test.each(frozenChanges)('keeps its columns from %s', (change) =>
    refused(`UPDATE revisions SET ${change} WHERE id = :id`),
  );

  test('cannot be deleted, replaced or emptied', async () => {
    await refused('DELETE FROM revisions WHERE id = :id');
    const replacing = `REPLACE INTO revisions (id, family_id, sequence, definition, definition_hash, author_id)
      SELECT id, family_id, sequence, '{}', definition_hash, author_id FROM revisions WHERE id = :id`;
    await expect(sql(replacing)).rejects.toThrow();
    await refused(`INSERT INTO revisions (id, family_id, sequence, definition, definition_hash, author_id)
      SELECT id, family_id, sequence, definition, definition_hash, author_id FROM revisions WHERE id = :id
      ON DUPLICATE KEY UPDATE definition = '{}'`);
    const [row] = await harness.db.select<{ definition: string; variants: number }>(
      'SELECT definition, (SELECT COUNT(*) FROM variants WHERE revision_id = :id) AS variants FROM revisions WHERE id = :id',
      { id: revision },
    );
    expect(row).toEqual({ definition: '{"a":1}', variants: 2 });
  });

  test('may be superseded or withdrawn, and then stays as it was', async () => {
    const before = await harness.db.select('SELECT * FROM variants WHERE revision_id = :id', {
      id: revision,
    });
    expect(await sql("UPDATE revisions SET state = 'superseded' WHERE id = :id")).toBe(1);
    await refused("UPDATE revisions SET state = 'published' WHERE id = :id");
    await refused("UPDATE revisions SET definition = '{}' WHERE id = :id");
    for (const change of rowChanges) await refused(change);
    const now = await harness.db.select('SELECT * FROM variants WHERE revision_id = :id', { id: revision });
    expect(now).toEqual(before);
  });

  test('takes a reason only with its withdrawal', async () => {
    await refused("UPDATE revisions SET withdrawn_reason = 'because' WHERE id = :id");
    const withdrawal = "UPDATE revisions SET state = 'withdrawn', withdrawn_reason = 'cracks' WHERE id = :id";
    expect(await sql(withdrawal)).toBe(1);
    await refused("UPDATE revisions SET withdrawn_reason = 'other' WHERE id = :id");
  });
});

describe('on the way to publication', () => {
  test('the cells of a swept revision are kept until it is a draft again', async () => {
    await bringTo('swept');
    for (const change of rowChanges) await refused(change);
    await sql("UPDATE revisions SET state = 'draft' WHERE id = :id");
    expect(await sql('DELETE FROM variants WHERE revision_id = :id')).toBe(2);
  });

  test('a revision in check keeps its definition and its results', async () => {
    await bringTo('in-check');
    await refused("UPDATE revisions SET definition = '{}' WHERE id = :id");
    await refused('UPDATE revisions SET rejected_cells = 7 WHERE id = :id');
    await refused('DELETE FROM revisions WHERE id = :id');
  });

  test.each(['draft', 'swept', 'in-check'])('a %s revision cannot be published', async (state) => {
    if (state !== 'draft') await bringTo(state);
    await refused("UPDATE revisions SET state = 'published', letter = 'A' WHERE id = :id");
    await refused("UPDATE revisions SET state = 'locked' WHERE id = :id");
  });

  test('publication needs letter, hash, publisher and time', async () => {
    await bringTo('checked');
    await refused("UPDATE revisions SET state = 'published' WHERE id = :id");
  });

  test('nobody checks their own work', async () => {
    await bringTo('in-check');
    const own = sql("UPDATE revisions SET state = 'checked', checker_id = author_id WHERE id = :id");
    await expect(own).rejects.toMatchObject({ original: { errno: 4025 } });
  });

  test('a revision begins as a draft', () =>
    refused(`INSERT INTO revisions (family_id, sequence, definition, definition_hash, author_id, state)
      SELECT family_id, 2, definition, definition_hash, author_id, 'published' FROM revisions WHERE id = :id`));
});

describe('what is written once', () => {
  test('signatures, exports and saves cannot be altered or taken away', async () => {
    const person = harness.people.engineer.id;
    await sql(
      "INSERT INTO signatures (revision_id, person_id, verdict, comment, at) VALUES (:id, :person, 'signed', 'seen', NOW(3))",
      { person },
    );
    await sql(
      `INSERT INTO exports (revision_id, person_id, format, drawing_number, layout, file_hash)
       VALUES (:id, :person, 'xlsx', 'S-101', '{}', :hash)`,
      { person, hash },
    );
    await sql(
      `INSERT INTO definition_saves (revision_id, number, definition, definition_hash, person_id)
       VALUES (:id, 1, '{}', :hash, :person)`,
      { person, hash },
    );
    for (const table of ['signatures', 'exports', 'definition_saves']) {
      await refused(`UPDATE ${table} SET person_id = person_id + 1 WHERE revision_id = :id`);
      await refused(`DELETE FROM ${table} WHERE revision_id = :id`);
    }
  });
});

describe('the account of the program', () => {
  test('has four rights and no more', async () => {
    const grants = await harness.db.select<Record<string, string>>('SHOW GRANTS');
    const rights = grants
      .flatMap((row) => Object.values(row))
      .map((text) => text.replace(/ TO .*| IDENTIFIED.*/, ''));
    expect(rights).toHaveLength(2);
    expect(rights[0]).toBe('GRANT USAGE ON *.*');
    expect(rights[1]).toMatch(/^GRANT SELECT, INSERT, UPDATE, DELETE ON `test\w+`\.\*$/);
  });

  test.each([
    'TRUNCATE TABLE variants',
    'TRUNCATE TABLE audit',
    'ALTER TABLE variants DROP COLUMN mass',
    'DROP TRIGGER revisions_frozen',
    'DROP TABLE variants',
    'RENAME TABLE variants TO other',
    "LOAD DATA LOCAL INFILE '/dev/null' REPLACE INTO TABLE variants",
    "SELECT 1 INTO OUTFILE '/tmp/backmark-outfile'",
    'SET GLOBAL innodb_lock_wait_timeout = 1',
  ])('may not %s', async (statement) => {
    await expect(harness.db.execute(statement)).rejects.toThrow();
    const [row] = await harness.db.select<{ n: number }>(
      'SELECT COUNT(*) AS n FROM variants WHERE revision_id = ?',
      [revision],
    );
    expect(row?.n).toBe(2);
  });

  test('cannot pass the triggers by through a cascade', async () => {
    await bringTo('published');
    await expect(sql('DELETE FROM families')).rejects.toMatchObject({ original: { errno: 1451 } });
    const unchecked = harness.db.transaction(async (transaction) => {
      await harness.db.execute('SET SESSION foreign_key_checks = 0', undefined, transaction);
      try {
        await harness.db.execute('DELETE FROM revisions WHERE id = :id', { id: revision }, transaction);
      } finally {
        await harness.db.execute('SET SESSION foreign_key_checks = 1', undefined, transaction);
      }
    });
    await expect(unchecked).rejects.toMatchObject({ original: { errno: 1644 } });
  });
});

test('every foreign key restricts', async () => {
  const owner = createPool(harness.ownerUrl, 1);
  const rows = await harness.db.select<{ DELETE_RULE: string; UPDATE_RULE: string }>(
    'SELECT DELETE_RULE, UPDATE_RULE FROM information_schema.REFERENTIAL_CONSTRAINTS WHERE CONSTRAINT_SCHEMA = DATABASE()',
  );
  await owner.close();
  expect(rows.length).toBeGreaterThan(15);
  for (const row of rows) expect(row).toEqual({ DELETE_RULE: 'RESTRICT', UPDATE_RULE: 'RESTRICT' });
});
