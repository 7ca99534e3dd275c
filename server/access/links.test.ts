import { expect, it } from 'vitest';
import { hashToken, linkToken } from './links';

const secret = 's'.repeat(48);

it('makes the same address for the same thing, and another for each kind, id, version and post', () => {
  const base = linkToken(secret, 'ticket', 'id-1', 1);
  expect(linkToken(secret, 'ticket', 'id-1', 1)).toBe(base);
  const others = [
    linkToken(secret, 'record', 'id-1', 1),
    linkToken(secret, 'ticket', 'id-2', 1),
    linkToken(secret, 'ticket', 'id-1', 2),
    linkToken('t'.repeat(48), 'ticket', 'id-1', 1),
  ];
  expect(new Set([base, ...others]).size).toBe(5);
  expect(base).toMatch(/^[\w-]{43}$/);
  expect(hashToken(base)).not.toBe(base);
});
