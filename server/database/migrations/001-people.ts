import { createTable, dropTable, exact, foreignKey, type Migration } from './migration.ts';

export const people: Migration = {
  name: '001-people',
  up: [
    createTable('people', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      `email VARCHAR(254) NOT NULL`,
      'name VARCHAR(120) NOT NULL',
      `role VARCHAR(20) ${exact} NOT NULL CHECK (role IN ('standards-manager', 'engineer', 'drafter', 'admin'))`,
      `state VARCHAR(10) ${exact} NOT NULL DEFAULT 'active' CHECK (state IN ('active', 'disabled'))`,
      `password_hash VARCHAR(200) ${exact} NOT NULL`,
      'last_sign_in_at DATETIME(3) NULL',
      'lock_version INT NOT NULL DEFAULT 0',
      'created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'updated_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'UNIQUE KEY people_email (email)',
    ]),
  ],
  down: [dropTable('people')],
};

export const sessions: Migration = {
  name: '002-sessions',
  up: [
    createTable('sessions', [
      `id CHAR(36) ${exact} NOT NULL PRIMARY KEY`,
      'person_id BIGINT NOT NULL',
      `refresh_hash CHAR(64) ${exact} NOT NULL`,
      `previous_refresh_hash CHAR(64) ${exact} NULL`,
      'created_at DATETIME(3) NOT NULL',
      'last_used_at DATETIME(3) NOT NULL',
      'expires_at DATETIME(3) NOT NULL',
      'revoked_at DATETIME(3) NULL',
      'UNIQUE KEY sessions_refresh (refresh_hash)',
      'KEY sessions_previous (previous_refresh_hash)',
      foreignKey('sessions', 'person_id', 'people'),
    ]),
  ],
  down: [dropTable('sessions')],
};

export const signInFailures: Migration = {
  name: '003-sign-in-failures',
  up: [
    createTable('sign_in_failures', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      `account_key CHAR(64) ${exact} NOT NULL`,
      `ip VARCHAR(45) ${exact} NOT NULL`,
      'at DATETIME(3) NOT NULL',
      'KEY sign_in_failures_account (account_key, at)',
      'KEY sign_in_failures_ip (ip, at)',
      'KEY sign_in_failures_at (at)',
    ]),
  ],
  down: [dropTable('sign_in_failures')],
};
