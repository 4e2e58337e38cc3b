import { createHash, createHmac, randomBytes } from 'node:crypto';
import { isId } from '../common/id';

/** What the refresh cookie carries: which session, and a secret only that device knows. */
export interface RefreshToken {
  sessionId: string;
  secret: string;
}

export function newSecret(): string {
  return randomBytes(32).toString('base64url');
}

/**
 * The secret that replaces this one. Worked out and not drawn, so that a token sent twice is answered twice with the
 * same successor, in whatever order the answers arrive; without the server's key nobody can work it out.
 */
export function successorOf({ sessionId, secret }: RefreshToken, key: string): string {
  return createHmac('sha256', key).update(`refresh ${sessionId} ${secret}`).digest('base64url');
}

export function hashOf(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}

export function writeRefreshToken({ sessionId, secret }: RefreshToken): string {
  return `${sessionId}.${secret}`;
}

/** @returns undefined for anything that was not written by {@link writeRefreshToken}. */
export function readRefreshToken(text: unknown): RefreshToken | undefined {
  if (typeof text !== 'string') return undefined;
  const [sessionId, secret, ...rest] = text.split('.');
  if (!sessionId || !secret || rest.length > 0 || !isId(sessionId)) return undefined;
  return { sessionId, secret };
}
