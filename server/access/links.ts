import { createHash, createHmac } from 'node:crypto';

/** What a link gives authority over. One kind never passes for another. */
export type LinkKind = 'ticket' | 'record';

/**
 * An unguessable address: base64url HMAC-SHA-256 of (kind, id, version) under the post's secret.
 * It can be made again at any time, so the database keeps only its hash.
 */
export function linkToken(secret: string, kind: LinkKind, id: string, version: number): string {
  return createHmac('sha256', secret).update(`${kind}\n${id}\n${version}`).digest('base64url');
}

/** What the database keeps of a token. */
export const hashToken = (token: string): string =>
  createHash('sha256').update(token).digest('base64url');
