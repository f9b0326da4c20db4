import { pino, stdTimeFunctions, type DestinationStream, type Logger } from 'pino';
import type { Config } from './config.ts';

const secrets = [
  'password',
  'current',
  'next',
  'token',
  'cookie',
  'authorization',
  'authSecret',
  'databaseUrl',
];

/** What is said of an error: never the SQL or its values, which Sequelize puts into its message. */
function describeError(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { message: 'something that is not an error was thrown' };
  const { original } = error as { original?: { sqlMessage?: string; code?: string; errno?: number } };
  const frames = error.stack?.split('\n').filter((line) => line.trimStart().startsWith('at ')) ?? [];
  return {
    type: error.name,
    message: original ? (original.sqlMessage ?? original.code ?? 'database error') : error.message,
    ...(original?.errno ? { errno: original.errno } : {}),
    stack: frames.slice(0, 12).map((line) => line.trim()),
  };
}

/** JSON lines on standard output, with everything that could be a secret taken out. */
export function createLog(config: Pick<Config, 'logLevel'>, destination?: DestinationStream): Logger {
  const options = {
    level: config.logLevel,
    base: null,
    timestamp: stdTimeFunctions.isoTime,
    redact: { paths: secrets.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]), censor: '[taken out]' },
    serializers: { err: describeError },
  };
  return destination ? pino(options, destination) : pino(options);
}
