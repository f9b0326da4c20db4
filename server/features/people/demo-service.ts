import type { Role } from '@shared/contracts/common.ts';
import type { App } from '../../context.ts';
import { hashPassword } from '../auth/service.ts';
import { appendAudit } from '../audit/service.ts';

const password = 'harrow quay drawing office';

/** The invented people of an invented firm. */
export const demoPeople: readonly { name: string; email: string; role: Role; password: string }[] = [
  { name: 'Thandeka Marais', email: 'standards@harrowquay.example', role: 'standards-manager', password },
  { name: 'Ivo Brandgard', email: 'engineer@harrowquay.example', role: 'engineer', password },
  { name: 'Lena Storhaug', email: 'drafter@harrowquay.example', role: 'drafter', password },
  { name: 'Priya Oduya', email: 'admin@harrowquay.example', role: 'admin', password },
];

/**
 * Adds the demo people to a database without people.
 * @returns how many were added
 */
export async function addDemoPeople(app: App): Promise<number> {
  const { Person } = app.db.models;
  if ((await Person.count()) > 0) return 0;
  const passwordHash = await hashPassword(password);
  return app.db.transaction(async (transaction) => {
    for (const { name, email, role } of demoPeople) {
      const person = await Person.create({ name, email, role, passwordHash }, { transaction });
      await appendAudit(
        transaction,
        {
          actorId: null,
          action: 'person.created',
          subjectType: 'person',
          subjectId: person.id,
          detail: { name, role },
        },
        app.clock.now(),
      );
    }
    return demoPeople.length;
  });
}
