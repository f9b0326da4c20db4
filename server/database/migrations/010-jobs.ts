import { createTable, dropTable, exact, foreignKey, type Migration } from './migration.ts';

export const jobs: Migration = {
  name: '010-jobs',
  up: [
    createTable('jobs', [
      'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY',
      `kind VARCHAR(20) ${exact} NOT NULL DEFAULT 'sweep'`,
      'revision_id BIGINT NOT NULL',
      'requested_by BIGINT NOT NULL',
      'spec JSON NOT NULL',
      `spec_hash CHAR(64) ${exact} NOT NULL`,
      `state VARCHAR(10) ${exact} NOT NULL DEFAULT 'queued' CHECK (state IN ('queued', 'running', 'done', 'failed', 'cancelled'))`,
      'priority INT NOT NULL DEFAULT 0',
      'attempts INT NOT NULL DEFAULT 0',
      'run_after DATETIME(3) NULL',
      `lease_owner VARCHAR(80) ${exact} NULL`,
      'lease_until DATETIME(3) NULL',
      'fence BIGINT NOT NULL DEFAULT 0',
      'chunk_count INT NOT NULL',
      'chunks_done INT NOT NULL DEFAULT 0',
      'cancel_requested BOOLEAN NOT NULL DEFAULT FALSE',
      'error VARCHAR(2000) NULL',
      'created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
      'started_at DATETIME(3) NULL',
      'finished_at DATETIME(3) NULL',
      // A unique key ignores NULL, so any number of finished jobs and one live one a revision.
      "live_revision BIGINT AS (IF(state IN ('queued', 'running'), revision_id, NULL)) PERSISTENT",
      'UNIQUE KEY jobs_live (live_revision)',
      'KEY jobs_claim (state, priority, id)',
      foreignKey('jobs', 'revision_id', 'revisions'),
      foreignKey('jobs', 'requested_by', 'people'),
    ]),
  ],
  down: [dropTable('jobs')],
};

export const jobChunks: Migration = {
  name: '011-job-chunks',
  up: [
    createTable('job_chunks', [
      'job_id BIGINT NOT NULL',
      'number INT NOT NULL',
      `state VARCHAR(10) ${exact} NOT NULL DEFAULT 'waiting' CHECK (state IN ('waiting', 'done', 'failed'))`,
      'attempts INT NOT NULL DEFAULT 0',
      'first_ordinal INT NOT NULL',
      'variant_count INT NOT NULL',
      `result_hash CHAR(64) ${exact} NULL`,
      'PRIMARY KEY (job_id, number)',
      'KEY job_chunks_state (job_id, state, number)',
      foreignKey('job_chunks', 'job_id', 'jobs'),
    ]),
  ],
  down: [dropTable('job_chunks')],
};
