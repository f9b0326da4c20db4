import { exact, type Migration } from './migration.ts';

const verdict = (known: readonly string[]) =>
  `ALTER TABLE signatures MODIFY COLUMN verdict VARCHAR(10) ${exact} NOT NULL CHECK (verdict IN (${known
    .map((word) => `'${word}'`)
    .join(', ')}))`;

/** What the author writes to the checker stands beside what the checker answers. */
export const submissions: Migration = {
  name: '019-submissions',
  up: [verdict(['submitted', 'signed', 'returned'])],
  down: [verdict(['signed', 'returned'])],
};
