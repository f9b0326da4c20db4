import { refuse, refuseIf, type Migration } from './migration.ts';

const kept = ['audit', 'signatures', 'exports', 'definition_saves'];

export const appendOnly: Migration = {
  name: '017-append-only',
  up: [
    ...kept.flatMap((table) => [
      refuse(table, 'UPDATE', `what stands in ${table} is never altered`),
      refuse(table, 'DELETE', `what stands in ${table} is never taken away`),
    ]),
    refuse('audit_head', 'INSERT', 'the audit trail has one head'),
    refuse('audit_head', 'DELETE', 'the audit trail keeps its head'),
    `CREATE TRIGGER audit_head_forward BEFORE UPDATE ON audit_head FOR EACH ROW BEGIN ${refuseIf(
      'NEW.id <> OLD.id OR NEW.seq <> OLD.seq + 1',
      'the audit trail moves forward by one entry',
    )} END`,
  ],
  down: [
    'DROP TRIGGER audit_head_forward',
    'DROP TRIGGER audit_head_no_delete',
    'DROP TRIGGER audit_head_no_insert',
    ...kept.flatMap((table) => [`DROP TRIGGER ${table}_no_delete`, `DROP TRIGGER ${table}_no_update`]),
  ],
};
