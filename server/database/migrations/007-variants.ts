import { createTable, dropTable, exact, foreignKey, type Migration } from './migration.ts';

export const variants: Migration = {
  name: '007-variants',
  up: [
    createTable('variants', [
      'revision_id BIGINT NOT NULL',
      'ordinal INT NOT NULL',
      `params_hash CHAR(32) ${exact} NOT NULL`,
      'params JSON NOT NULL',
      'mass DOUBLE NOT NULL',
      'bolt_count INT NOT NULL',
      'weld_volume DOUBLE NOT NULL',
      'lowest DOUBLE NULL',
      'capacities LONGBLOB NOT NULL',
      'governing LONGBLOB NOT NULL',
      'PRIMARY KEY (revision_id, ordinal)',
      'UNIQUE KEY variants_params (revision_id, params_hash)',
      foreignKey('variants', 'revision_id', 'revisions'),
    ]),
  ],
  down: [dropTable('variants')],
};

export const signatures: Migration = {
  name: '008-signatures',
  up: [
    createTable('signatures', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      'revision_id BIGINT NOT NULL',
      'person_id BIGINT NOT NULL',
      `verdict VARCHAR(10) ${exact} NOT NULL CHECK (verdict IN ('signed', 'returned'))`,
      'comment VARCHAR(2000) NOT NULL',
      'at DATETIME(3) NOT NULL',
      foreignKey('signatures', 'revision_id', 'revisions'),
      foreignKey('signatures', 'person_id', 'people'),
    ]),
  ],
  down: [dropTable('signatures')],
};

export const exports: Migration = {
  name: '009-exports',
  up: [
    createTable('exports', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      'revision_id BIGINT NOT NULL',
      'person_id BIGINT NOT NULL',
      `format VARCHAR(10) ${exact} NOT NULL`,
      'drawing_number VARCHAR(40) NOT NULL',
      'layout JSON NOT NULL',
      `file_hash CHAR(64) ${exact} NOT NULL`,
      'created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'KEY exports_created (created_at)',
      foreignKey('exports', 'revision_id', 'revisions'),
      foreignKey('exports', 'person_id', 'people'),
    ]),
  ],
  down: [dropTable('exports')],
};
