import type { Account } from './mariadb.mjs';

export function databaseStatements(database: string, owner: Account, application: Account): string[];
export function dropStatements(database: string, owner: Account, application: Account): string[];
export function administratorStatements(account: Account): string[];
export function databaseUrl(account: Account, port: number, database?: string): string;
