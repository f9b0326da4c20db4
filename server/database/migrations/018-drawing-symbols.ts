import { exact, type Migration } from './migration.ts';

/** Which standard the weld symbols on drawings follow. */
export const drawingSymbols: Migration = {
  name: '018-drawing-symbols',
  up: [
    `ALTER TABLE settings ADD COLUMN weld_symbols VARCHAR(12) ${exact} NOT NULL DEFAULT 'iso-2553' AFTER factors, ADD CONSTRAINT settings_weld_symbols_known CHECK (weld_symbols IN ('iso-2553', 'aws-a2.4'))`,
  ],
  down: ['ALTER TABLE settings DROP CONSTRAINT settings_weld_symbols_known, DROP COLUMN weld_symbols'],
};
