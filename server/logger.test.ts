import { Writable } from 'node:stream';
import { expect, it } from 'vitest';
import { visitors } from '@/db/schema';
import { fixedId } from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { createLogger } from './logger';

const lines = () => {
  const written: string[] = [];
  const to = new Writable({
    write(chunk, _encoding, done) {
      written.push(String(chunk));
      done();
    },
  });
  return { log: createLogger('info', to), text: () => written.join('') };
};

it('says what failed in the store, and none of what was to be stored', async () => {
  const { db } = await testStore();
  const row = {
    id: fixedId('visitor', 1),
    name: 'Wren Alder\u0000',
    email: 'wren@example.org',
    mobile: '+44 1632 960000',
    createdAt: new Date('2026-06-13T09:00:00Z'),
  };
  const error = await db
    .insert(visitors)
    .values(row)
    .then(
      () => null,
      (failure: unknown) => failure,
    );
  expect(error).toBeInstanceOf(Error);
  const { log, text } = lines();
  log.error({ err: error }, 'a request failed');
  expect(text()).toContain('insert into');
  expect(text()).toContain('encoding');
  expect(text()).not.toMatch(/Wren|example|1632/);
});

it('keeps message and stack of other errors', () => {
  const { log, text } = lines();
  log.error({ err: new Error('the cable is out') }, 'a tester failed');
  expect(text()).toContain('the cable is out');
  expect(text()).toContain('logger.test');
});
