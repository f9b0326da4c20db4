import type { App } from '../../context.ts';
import type { PersonRow } from '../../database/models/person.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { appendAudit } from '../audit/service.ts';
import { hashPassword, isWeak, passwordMatches } from './passwords.ts';
import { endSessions, openSession, type Tokens } from './session-service.ts';
import { admitAttempt, forgive } from './throttle.ts';

export { hashPassword } from './passwords.ts';
export { endSessions } from './session-service.ts';

/**
 * Opens a session. Unknown address, wrong password and disabled account get the same answer after the same work.
 * @throws {ProblemError} sign-in-refused, rate-limited
 */
export async function signIn(
  app: App,
  { email, password }: { email: string; password: string },
  ip: string,
): Promise<Tokens> {
  await admitAttempt(app, email, ip);
  const person = await app.db.models.Person.findOne({ where: { email } });
  const matches = await passwordMatches(person?.passwordHash, password);
  if (!person || !matches || person.state !== 'active') {
    app.log.warn({ personId: person?.id, ip }, 'sign-in refused');
    problem('sign-in-refused');
  }
  const tokens = await welcome(app, person, password);
  await forgive(app, email);
  return tokens;
}

async function welcome(app: App, person: PersonRow, password: string): Promise<Tokens> {
  const renewedHash = isWeak(person.passwordHash) ? await hashPassword(password) : person.passwordHash;
  const now = app.clock.now();
  return app.db.transaction(async (transaction) => {
    const tokens = await openSession(app, person.id, transaction);
    // Not an edit: the lock version, which people's edits are compared by, stays.
    await app.db.execute(
      'UPDATE people SET last_sign_in_at = :now, password_hash = :renewedHash WHERE id = :id AND password_hash = :seen',
      { now, renewedHash, id: person.id, seen: person.passwordHash },
      transaction,
    );
    await appendAudit(
      transaction,
      { actorId: person.id, action: 'person.signed-in', subjectType: 'person', subjectId: person.id },
      now,
    );
    return tokens;
  });
}

/**
 * Changes one's own password and ends every other session.
 * @throws {ProblemError} validation when the current one is wrong
 */
export async function changePassword(
  app: App,
  person: SignedInPerson,
  change: { current: string; next: string },
  ip: string,
): Promise<void> {
  await admitAttempt(app, person.email, ip);
  const row = await app.db.models.Person.findByPk(person.id);
  if (!(await passwordMatches(row?.passwordHash, change.current))) {
    problem('validation', {
      errors: [{ field: 'current', message: 'This is not your present password.' }],
    });
  }
  const passwordHash = await hashPassword(change.next);
  await app.db.transaction(async (transaction) => {
    await app.db.execute(
      'UPDATE people SET password_hash = :passwordHash WHERE id = :id',
      { passwordHash, id: person.id },
      transaction,
    );
    const ended = await endSessions(app, person.id, transaction, person.sessionId);
    await appendAudit(
      transaction,
      {
        actorId: person.id,
        action: 'person.password-changed',
        subjectType: 'person',
        subjectId: person.id,
        detail: { otherSessionsEnded: ended },
      },
      app.clock.now(),
    );
  });
  await forgive(app, person.email);
}
