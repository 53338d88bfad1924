import { createHash, randomBytes } from 'node:crypto';

const DAYS = 7;

/** What the link of an invitation carries, and what is stored of it. */
export function newInvitationToken(now: Date): { token: string; tokenHash: string; expiresAt: Date } {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: hashOf(token), expiresAt: new Date(now.getTime() + DAYS * 86_400_000) };
}

export function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
