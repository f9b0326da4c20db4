import type { Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import type { Role } from '@shared/contracts/common.ts';
import { createApp } from '@server/app.ts';
import { loadConfig } from '@server/config/config.ts';
import { createContext, type App } from '@server/context.ts';
import { migrateDatabase } from '@server/database/migrate.ts';
import { createDatabase, type Database } from '@server/database/sequelize.ts';
import { hashPassword } from '@server/features/auth/service.ts';
import type { RouteDeclaration } from '@server/http/route.ts';
import { createTestDatabase } from '../support/database.ts';

export const password = 'a slow blue tram to the yard';
export const roles: readonly Role[] = ['standards-manager', 'engineer', 'drafter', 'admin'];
export type Agent = ReturnType<typeof request.agent>;

/** A clock that stands until it is moved. */
export interface TestClock {
  now(): Date;
  forward(seconds: number): void;
}

/** The application on a migrated database of its own, with one person of each role and a second engineer. */
export interface Harness {
  app: App;
  server: Express;
  db: Database;
  clock: TestClock;
  /** Everything that was logged, as JSON lines. */
  logged: string[];
  ownerUrl: string;
  appUrl: string;
  people: Record<Role, { id: number; email: string }>;
  /** Somebody without a session; sends what a script must send. */
  stranger(): Agent;
  signedIn(role: Role): Promise<Agent>;
  signIn(email: string, secret?: string): Promise<Agent>;
  close(): Promise<void>;
}

function testClock(): TestClock {
  let moment = Date.now();
  return {
    now: () => new Date(moment),
    forward: (seconds) => void (moment += seconds * 1000),
  };
}

async function addPeople(db: Database) {
  const passwordHash = await hashPassword(password);
  const entries = [];
  for (const role of roles) {
    const email = `${role}@harrowquay.example`;
    const person = await db.models.Person.create({ name: `The ${role}`, email, role, passwordHash });
    entries.push([role, { id: person.id, email }] as const);
  }
  return Object.fromEntries(entries) as Harness['people'];
}

/** Makes all of it; call `close` when the test file is done. */
export async function createHarness(
  environment: Record<string, string> = {},
  routes?: readonly RouteDeclaration[],
): Promise<Harness> {
  const database = await createTestDatabase();
  await migrateDatabase(database.ownerUrl);
  const config = loadConfig({
    NODE_ENV: 'test',
    DATABASE_URL: database.appUrl,
    AUTH_SECRET: 'only for tests, and at least so long',
    LOG_LEVEL: 'info',
    RATE_LIMIT_PER_MINUTE: '1000000',
    ...environment,
  });
  const clock = testClock();
  const logged: string[] = [];
  const db = createDatabase(database.appUrl, { connections: 6 });
  const log = pino({ level: 'info', base: null }, { write: (line: string) => void logged.push(line) });
  const app = createContext(config, { db, clock, log });
  const server = createApp(app, routes);
  const people = await addPeople(db);
  const stranger = () => request.agent(server).set('X-Requested-By', 'backmark');
  const signIn = async (email: string, secret = password) => {
    const agent = stranger();
    await agent.post('/api/auth/sign-in').send({ email, password: secret }).expect(204);
    return agent;
  };
  return {
    app,
    server,
    db,
    clock,
    logged,
    ownerUrl: database.ownerUrl,
    appUrl: database.appUrl,
    people,
    stranger,
    signIn,
    signedIn: (role) => signIn(people[role].email),
    async close() {
      await db.close();
      await database.drop();
    },
  };
}
