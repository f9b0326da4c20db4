/** One concern of the tables. Never edited once it has landed: MariaDB commits each statement of it at once. */
export interface Migration {
  readonly name: string;
  readonly up: readonly string[];
  readonly down: readonly string[];
}

const ending = 'ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci';

/** CREATE TABLE with the engine and character set that all tables share. */
export const createTable = (name: string, lines: readonly string[]): string =>
  `CREATE TABLE ${name} (\n  ${lines.join(',\n  ')}\n) ${ending}`;

export const dropTable = (name: string): string => `DROP TABLE ${name}`;

/** Text compared byte for byte: hashes, canonical JSON. */
export const exact = 'CHARACTER SET utf8mb4 COLLATE utf8mb4_bin';

/** A reference that neither deletes nor changes what it points at: cascades would pass the triggers by. */
export const foreignKey = (table: string, column: string, parent: string): string =>
  `CONSTRAINT ${table}_${column}_fk FOREIGN KEY (${column}) REFERENCES ${parent} (id) ON DELETE RESTRICT ON UPDATE RESTRICT`;

const signal = (message: string): string =>
  `SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'RECORD_LOCKED: ${message}'`;

/** Statements for a trigger body: refuse when the condition holds. */
export const refuseIf = (condition: string, message: string): string =>
  `IF ${condition} THEN ${signal(message)}; END IF;`;

/** A trigger that refuses every such change. */
export const refuse = (table: string, event: 'INSERT' | 'UPDATE' | 'DELETE', message: string): string =>
  `CREATE TRIGGER ${table}_no_${event.toLowerCase()} BEFORE ${event} ON ${table} FOR EACH ROW ${signal(message)}`;
