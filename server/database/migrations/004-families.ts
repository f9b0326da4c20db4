import { createTable, dropTable, exact, foreignKey, type Migration } from './migration.ts';

/** Written so, the column stays text: a plain JSON_VALID(…) check makes the connector hand over an object. */
const validDefinition = 'CHECK (JSON_VALID(definition) = 1)';

export const families: Migration = {
  name: '004-families',
  up: [
    createTable('families', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      `code VARCHAR(20) ${exact} NOT NULL`,
      'title VARCHAR(120) NOT NULL',
      `kind VARCHAR(40) ${exact} NOT NULL`,
      'lock_version INT NOT NULL DEFAULT 0',
      'created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'updated_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'UNIQUE KEY families_code (code)',
    ]),
  ],
  down: [dropTable('families')],
};

const states = ['draft', 'swept', 'in-check', 'checked', 'published', 'locked', 'superseded', 'withdrawn'];

export const revisions: Migration = {
  name: '005-revisions',
  up: [
    createTable('revisions', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      'family_id BIGINT NOT NULL',
      'sequence INT NOT NULL',
      `letter VARCHAR(3) ${exact} NULL`,
      `state VARCHAR(12) ${exact} NOT NULL DEFAULT 'draft'`,
      `definition LONGTEXT ${exact} NOT NULL ${validDefinition}`,
      `definition_hash CHAR(64) ${exact} NOT NULL`,
      `engine_version VARCHAR(20) ${exact} NULL`,
      `content_hash CHAR(64) ${exact} NULL`,
      'variant_count INT NULL',
      'cell_count INT NULL',
      'rejected_cells INT NULL',
      'author_id BIGINT NOT NULL',
      'checker_id BIGINT NULL',
      'publisher_id BIGINT NULL',
      'locker_id BIGINT NULL',
      'submitted_at DATETIME(3) NULL',
      'checked_at DATETIME(3) NULL',
      'published_at DATETIME(3) NULL',
      'locked_at DATETIME(3) NULL',
      'withdrawn_reason VARCHAR(2000) NULL',
      'result_summary JSON NULL',
      'lock_version INT NOT NULL DEFAULT 0',
      'created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'updated_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'UNIQUE KEY revisions_sequence (family_id, sequence)',
      'UNIQUE KEY revisions_letter (family_id, letter)',
      'KEY revisions_state (state)',
      'KEY revisions_content (content_hash)',
      `CONSTRAINT revisions_state_known CHECK (state IN (${states.map((state) => `'${state}'`).join(', ')}))`,
      'CONSTRAINT revisions_second_person CHECK (checker_id IS NULL OR checker_id <> author_id)',
      foreignKey('revisions', 'family_id', 'families'),
      foreignKey('revisions', 'author_id', 'people'),
      foreignKey('revisions', 'checker_id', 'people'),
      foreignKey('revisions', 'publisher_id', 'people'),
      foreignKey('revisions', 'locker_id', 'people'),
    ]),
  ],
  down: [dropTable('revisions')],
};

export const definitionSaves: Migration = {
  name: '006-definition-saves',
  up: [
    createTable('definition_saves', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      'revision_id BIGINT NOT NULL',
      'number INT NOT NULL',
      `definition LONGTEXT ${exact} NOT NULL ${validDefinition}`,
      `definition_hash CHAR(64) ${exact} NOT NULL`,
      'person_id BIGINT NOT NULL',
      'created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'UNIQUE KEY definition_saves_number (revision_id, number)',
      foreignKey('definition_saves', 'revision_id', 'revisions'),
      foreignKey('definition_saves', 'person_id', 'people'),
    ]),
  ],
  down: [dropTable('definition_saves')],
};
