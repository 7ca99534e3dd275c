import { describe, expect, it } from 'vitest';
import { readEnv } from './env';
import { loggablePath } from './logger';

describe('readEnv', () => {
  it('has defaults for everything', () => {
    expect(readEnv({ NODE_ENV: 'production' })).toMatchObject({
      port: 3000,
      origin: null,
      databaseUrl: null,
    });
  });

  it('takes a blank variable for a missing one', () => {
    expect(readEnv({ NODE_ENV: 'production', PULLPOST_ORIGIN: '  ', PORT: '' })).toMatchObject({
      origin: null,
      port: 3000,
    });
  });

  it('names each variable that cannot be used', () => {
    expect(() =>
      readEnv({ NODE_ENV: 'production', PORT: 'eighty', PULLPOST_ORIGIN: 'post' }),
    ).toThrow(/PORT[\s\S]*PULLPOST_ORIGIN/);
  });
});

it('no ticket or record address stands in the log', () => {
  expect(loggablePath('/t/secret-token?x=1')).toBe('/t/…');
  expect(loggablePath('/r/secret/pdf')).toBe('/r/…/pdf');
  expect(loggablePath('/m/meet/board')).toBe('/m/meet/board');
});
