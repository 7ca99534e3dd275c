import type { SessionOptions } from 'iron-session';

/** What the sealed cookie carries. The role is not in it: it is read from the database. */
export interface SessionData {
  staffId?: string;
  sessionVersion?: number;
}

export const SESSION_COOKIE = 'pullpost_staff';

/** Twelve hours: a meet day, with the evening. */
const TTL_SECONDS = 12 * 60 * 60;

/**
 * The cookie is not marked `secure`: a post serves plain HTTP on its own network unless its origin
 * says otherwise.
 */
export const sessionOptions = (secret: string, origin: string): SessionOptions => ({
  password: secret.slice(0, 64),
  cookieName: SESSION_COOKIE,
  ttl: TTL_SECONDS,
  cookieOptions: {
    httpOnly: true,
    sameSite: 'lax',
    secure: origin.startsWith('https:'),
    path: '/',
  },
});
