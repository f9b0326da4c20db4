import type { Role } from '@shared/contracts/common.ts';
import type { App } from '../../context.ts';
import { hashPassword } from '../auth/service.ts';
import { appendAudit } from '../audit/service.ts';

const password = 'harrow quay drawing office';

/** The invented people of an invented firm. */
export const demoPeople: readonly { name: string; email: string; role: Role; password: string }[] = [
  { name: 'Thandeka Marais', email: 'standards@harrowquay.example', role: 'standards-manager', password },
  { name: 'Ivo Brandgard', email: 'engineer@harrowquay.example', role: 'engineer', password },
  { name: 'Oluchi Venter', email: 'checker@harrowquay.example', role: 'engineer', password },
  { name: 'Marek Solheim', email: 'details@harrowquay.example', role: 'standards-manager', password },
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

/** Those of them who can sign in: a firm that has begun real work may have taken them out. */
export async function demoPeopleHere(app: App): Promise<typeof demoPeople> {
  const rows = await app.db.models.Person.findAll({ where: { state: 'active' }, attributes: ['email'] });
  const here = new Set(rows.map(({ email }) => email));
  return demoPeople.filter(({ email }) => here.has(email));
}
