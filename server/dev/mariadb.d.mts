/** A user of the database server. */
export interface Account {
  user: string;
  password: string;
}

/** A MariaDB server that this process started. */
export interface RunningServer {
  port: number;
  pid: number;
  files: { folder: string; datadir: string; socket: string; log: string };
  exited: Promise<{ code: number | null; signal: string | null }>;
  url(account: Account, database?: string): string;
  stop(): Promise<void>;
  kill(): Promise<unknown>;
}

export function startMariaDB(options: {
  folder: string;
  port: number;
  keepPort?: boolean;
  statements: string[];
  account: Account;
}): Promise<RunningServer>;
