interface Standing {
  readonly role: string;
  readonly state: string;
}

export interface PersonChange {
  /** The one who asks is the one who changes. */
  readonly self: boolean;
  /** Nobody else is an active admin. */
  readonly lastAdmin: boolean;
  readonly before: Standing;
  readonly after: Standing;
}

/** The office's rule about people: the sentence that refuses a change, or null when it may be made. */
export function refusalOf({ self, lastAdmin, before, after }: PersonChange): string | null {
  const wasAdmin = before.role === 'admin' && before.state === 'active';
  const staysAdmin = after.role === 'admin' && after.state === 'active';
  if (!wasAdmin || staysAdmin) return null;
  if (lastAdmin) return 'This is the last active admin; make another one first.';
  if (self) return 'You cannot take away your own access; another admin can.';
  return null;
}
