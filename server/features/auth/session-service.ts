import { randomUUID } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import type { App } from '../../context.ts';
import type { SessionRow } from '../../database/models/session.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { appendAudit } from '../audit/service.ts';
import { newRefreshToken, readAccess, refreshHash, signAccess } from './tokens.ts';

const absoluteHours = 12;
/** Counted from the last renewal, which an active page asks for every ten minutes. */
const idleMinutes = 40;
/** Two tabs may renew at the same moment with the same token. */
const graceSeconds = 10;

export interface Tokens {
  readonly access: string;
  /** Null when the renewal of another tab has set it already. */
  readonly refresh: string | null;
  readonly expires: Date;
}

const after = (moment: Date, seconds: number): Date => new Date(moment.getTime() + seconds * 1000);

/** The person behind an access token as the database knows them now: role and state count from the next request on. */
export async function sessionPerson(app: App, token: string): Promise<SignedInPerson | null> {
  const now = app.clock.now();
  const claims = readAccess(token, app.config.authSecret, now);
  if (!claims) return null;
  const [person] = await app.db.select<SignedInPerson>(
    `SELECT people.id, people.name, people.email, people.role, sessions.id AS sessionId
     FROM sessions JOIN people ON people.id = sessions.person_id
     WHERE sessions.id = :sessionId AND people.id = :personId AND people.state = 'active'
       AND sessions.revoked_at IS NULL AND sessions.expires_at > :now`,
    { ...claims, now },
  );
  return person ?? null;
}

/** Opens a session for someone whose password was right. */
export async function openSession(app: App, personId: number, transaction: Transaction): Promise<Tokens> {
  const now = app.clock.now();
  const refresh = newRefreshToken();
  const expires = after(now, absoluteHours * 3600);
  const { id } = await app.db.models.Session.create(
    {
      id: randomUUID(),
      personId,
      refreshHash: refreshHash(refresh),
      createdAt: now,
      lastUsedAt: now,
      expiresAt: expires,
    },
    { transaction },
  );
  return { access: signAccess({ personId, sessionId: id }, app.config.authSecret, now), refresh, expires };
}

/** Ends the sessions of a person, all but one if it is named; returns how many. */
export async function endSessions(
  app: App,
  personId: number,
  transaction: Transaction,
  except = '',
): Promise<number> {
  return app.db.execute(
    'UPDATE sessions SET revoked_at = :now WHERE person_id = :personId AND id <> :except AND revoked_at IS NULL',
    { now: app.clock.now(), personId, except },
    transaction,
  );
}

export async function endSession(app: App, id: string): Promise<void> {
  await app.db.execute('UPDATE sessions SET revoked_at = :now WHERE id = :id AND revoked_at IS NULL', {
    now: app.clock.now(),
    id,
  });
}

type Renewal = Tokens | 'refused';

function renewFor(app: App, session: SessionRow, refresh: string | null): Tokens {
  const claims = { personId: session.personId, sessionId: session.id };
  const access = signAccess(claims, app.config.authSecret, app.clock.now());
  return { access, refresh, expires: session.expiresAt };
}

/** The token of before the last renewal: another tab's if it is quick, otherwise a stolen one. */
async function reused(app: App, session: SessionRow, transaction: Transaction): Promise<Renewal> {
  const now = app.clock.now();
  if (after(session.lastUsedAt, graceSeconds) >= now) return renewFor(app, session, null);
  await session.update({ revokedAt: now }, { transaction });
  await appendAudit(
    transaction,
    {
      actorId: session.personId,
      action: 'session.revoked',
      subjectType: 'person',
      subjectId: session.personId,
      detail: { reason: 'a refresh token was used twice' },
    },
    now,
  );
  return 'refused';
}

async function rotate(app: App, hash: string, transaction: Transaction): Promise<Renewal> {
  const { Session, Person } = app.db.models;
  const session = await Session.findOne({
    where: { [Op.or]: [{ refreshHash: hash }, { previousRefreshHash: hash }] },
    lock: transaction.LOCK.UPDATE,
    transaction,
  });
  const now = app.clock.now();
  if (!session || session.revokedAt || session.expiresAt <= now) return 'refused';
  if (after(session.lastUsedAt, idleMinutes * 60) < now) return 'refused';
  const person = await Person.findByPk(session.personId, { transaction });
  if (person?.state !== 'active') return 'refused';
  if (session.refreshHash !== hash) return reused(app, session, transaction);
  const refresh = newRefreshToken();
  await session.update(
    { refreshHash: refreshHash(refresh), previousRefreshHash: hash, lastUsedAt: now },
    { transaction },
  );
  return renewFor(app, session, refresh);
}

/**
 * Exchanges a refresh token for the next one and a new access token; a token that was exchanged before ends the
 * session.
 * @throws {ProblemError} unauthenticated
 */
export async function renewSession(app: App, refresh: string | undefined): Promise<Tokens> {
  if (refresh === undefined) problem('unauthenticated');
  const renewal = await app.db.transaction((transaction) => rotate(app, refreshHash(refresh), transaction));
  if (renewal === 'refused') problem('unauthenticated');
  return renewal;
}

/** Ends the session that a refresh token belongs to, if any. */
export async function endSessionOf(app: App, refresh: string): Promise<void> {
  await app.db.execute(
    'UPDATE sessions SET revoked_at = :now WHERE refresh_hash = :hash AND revoked_at IS NULL',
    {
      now: app.clock.now(),
      hash: refreshHash(refresh),
    },
  );
}
