import { beforeEach, describe, expect, it } from 'vitest';
import { fixedId, makeTag, makeWorld, ticketOf } from '@/tests/support/factories';
import { TEST_SECRET, testStore } from '@/tests/support/store';
import { linkToken } from '@/server/access/links';
import { ticketHolder } from './holder';

describe('ticketHolder', async () => {
  const store = await testStore();
  beforeEach(async () => {
    await store.reset();
    await makeWorld(store.db);
  });
  const holderOf = (token: string) => ticketHolder(store.db, token, TEST_SECRET);

  it('shows the tool, what was agreed, and the same visitor’s other tags alone', async () => {
    const second = await makeTag(store.db, 2, {
      visitorId: fixedId('visitor', 1),
      consent: 'working',
      workingPoints: [110, 200],
    });
    await makeTag(store.db, 3);
    expect(await holderOf(ticketOf(second))).toMatchObject({
      code: 'A02',
      meet: { slug: 'test-meet', joinOpen: true },
      plate: '60–340 N·m · claims ±4 %',
      consent: 'Working points only: 110 and 200 N·m',
      others: [{ code: 'A01', state: 'waiting', path: `/t/${ticketOf({ id: fixedId('tag') })}` }],
    });
  });

  it('knows nobody by another token', async () => {
    for (const token of ['', 'x', linkToken(TEST_SECRET, 'record', fixedId('tag'), 1)]) {
      expect(await holderOf(token)).toBeNull();
    }
  });
});
