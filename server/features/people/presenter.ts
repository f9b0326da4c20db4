import type { Person } from '@shared/contracts/auth.ts';
import type { PersonRow } from '../../database/models/person.ts';

export const presentPerson = (row: PersonRow): Person => ({
  id: row.id,
  name: row.name,
  email: row.email,
  role: row.role,
  state: row.state,
  lockVersion: row.lockVersion,
  lastSignInAt: row.lastSignInAt?.toISOString() ?? null,
});
