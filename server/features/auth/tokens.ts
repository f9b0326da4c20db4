import { createHash, randomBytes } from 'node:crypto';
import jwt from 'jsonwebtoken';

const algorithm = 'HS256';
const issuer = 'backmark';
const audience = 'backmark-api';

/** Seconds for which an access token is good. */
export const ACCESS_SECONDS = 600;

export interface AccessClaims {
  readonly personId: number;
  readonly sessionId: string;
}

const seconds = (moment: Date): number => Math.floor(moment.getTime() / 1000);

/** A signed token that names the person and the session. */
export function signAccess({ personId, sessionId }: AccessClaims, secret: string, now: Date): string {
  const iat = seconds(now);
  return jwt.sign({ sid: sessionId, iat, nbf: iat, exp: iat + ACCESS_SECONDS }, secret, {
    algorithm,
    issuer,
    audience,
    subject: String(personId),
  });
}

/** What a token says, or null for one that is forged, expired, for others, or in another algorithm. */
export function readAccess(token: string, secret: string, now: Date): AccessClaims | null {
  try {
    const claims = jwt.verify(token, secret, {
      algorithms: [algorithm],
      issuer,
      audience,
      clockTimestamp: seconds(now),
    });
    if (typeof claims === 'string' || typeof claims.sid !== 'string' || claims.exp === undefined) return null;
    const personId = Number(claims.sub);
    return Number.isSafeInteger(personId) ? { personId, sessionId: claims.sid } : null;
  } catch {
    return null;
  }
}

/** A refresh token of 256 random bits. */
export const newRefreshToken = (): string => randomBytes(32).toString('base64url');

/** What is kept of a refresh token. */
export const refreshHash = (token: string): string => createHash('sha256').update(token).digest('hex');
