import type { Role } from '@shared/contracts/common.ts';

/** What a role may do beyond single records. */
export const abilitiesOf = (role: Role) => ({
  defineFamilies: role === 'standards-manager',
  seeDrafts: role === 'standards-manager' || role === 'admin',
  exportTables: role !== 'admin',
  managePeople: role === 'admin',
  readAudit: role === 'admin',
});
