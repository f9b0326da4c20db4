import type { Me } from '@shared/contracts/auth.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { abilitiesOf } from './policy.ts';

export const presentMe = ({ id, name, email, role }: SignedInPerson): Me => ({
  id,
  name,
  email,
  role,
  can: abilitiesOf(role),
});
