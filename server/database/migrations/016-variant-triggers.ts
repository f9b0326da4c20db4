import { refuseIf, type Migration } from './migration.ts';

/**
 * The locking read makes a change of state wait for a chunk that is being stored, and the chunk for the change:
 * a plain read would let a row slip in beside it.
 */
const stateOf = (row: 'OLD' | 'NEW'): string =>
  `(SELECT state FROM revisions WHERE id = ${row}.revision_id LOCK IN SHARE MODE)`;

const onlyInDraft = (row: 'OLD' | 'NEW'): string =>
  refuseIf(
    `COALESCE(${stateOf(row)}, 'draft') <> 'draft'`,
    'the cells of a swept revision cannot be changed',
  );

const trigger = (event: string, rows: readonly ('OLD' | 'NEW')[]): string =>
  `CREATE TRIGGER variants_${event.toLowerCase()} BEFORE ${event} ON variants FOR EACH ROW BEGIN ${rows.map(onlyInDraft).join('\n')} END`;

export const variantTriggers: Migration = {
  name: '016-variant-triggers',
  up: [trigger('INSERT', ['NEW']), trigger('UPDATE', ['OLD', 'NEW']), trigger('DELETE', ['OLD'])],
  down: ['delete', 'update', 'insert'].map((event) => `DROP TRIGGER variants_${event}`),
};
