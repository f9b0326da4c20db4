import { createTable, dropTable, exact, foreignKey, type Migration } from './migration.ts';

/** What the first entry of the trail follows. */
const beginning = '0'.repeat(64);

export const audit: Migration = {
  name: '012-audit',
  up: [
    createTable('audit', [
      'seq BIGINT NOT NULL PRIMARY KEY',
      'at DATETIME(6) NOT NULL',
      'actor_id BIGINT NULL',
      `action VARCHAR(60) ${exact} NOT NULL`,
      `subject_type VARCHAR(40) ${exact} NOT NULL`,
      `subject_id VARCHAR(80) ${exact} NOT NULL`,
      `detail LONGTEXT ${exact} NOT NULL`,
      `previous_hash CHAR(64) ${exact} NOT NULL`,
      `hash CHAR(64) ${exact} NOT NULL`,
      'KEY audit_subject (subject_type, subject_id)',
      foreignKey('audit', 'actor_id', 'people'),
    ]),
  ],
  down: [dropTable('audit')],
};

export const auditHead: Migration = {
  name: '013-audit-head',
  up: [
    createTable('audit_head', [
      'id TINYINT NOT NULL PRIMARY KEY CHECK (id = 1)',
      'seq BIGINT NOT NULL',
      `hash CHAR(64) ${exact} NOT NULL`,
    ]),
    `INSERT INTO audit_head (id, seq, hash) VALUES (1, 0, '${beginning}')`,
  ],
  down: [dropTable('audit_head')],
};

export const settings: Migration = {
  name: '014-settings',
  up: [
    createTable('settings', [
      'id TINYINT NOT NULL PRIMARY KEY CHECK (id = 1)',
      'firm VARCHAR(120) NOT NULL',
      'increment DOUBLE NOT NULL',
      'factors JSON NOT NULL',
      'lock_version INT NOT NULL DEFAULT 0',
    ]),
    `INSERT INTO settings (id, firm, increment, factors) VALUES (1, 'The firm', 1, '{"gammaM0":1,"gammaM1":1,"gammaM2":1.25}')`,
  ],
  down: [dropTable('settings')],
};
