import { v7 as uuidv7 } from 'uuid';
import { expect, it } from 'vitest';
import { signOff } from '@/server/commands/check/sign-off';
import { stopEarly } from '@/server/commands/check/stop-early';
import { linkToken } from '@/server/access/links';
import { actorOf, makeWorld, ticketOf } from '@/tests/support/factories';
import { checkOnBench } from '@/tests/support/line';
import { TEST_SECRET, testStore } from '@/tests/support/store';
import { recordOfToken } from './by-token';

it('shows a record by its own link alone', async () => {
  const store = await testStore();
  await store.reset();
  const world = await makeWorld(store.db);
  const operator = store.contextFor(actorOf(world.staff.operator));
  const checkId = await checkOnBench(operator, world.bench.id, world.tag.id);
  await stopEarly(operator, uuidv7(), { checkId, reason: 'Rain' });
  const { recordId } = await signOff(operator, uuidv7(), { checkId });

  const record = await recordOfToken(store.db, linkToken(TEST_SECRET, 'record', recordId, 1));
  expect(record).toMatchObject({ number: 'TP-2026-0001', tagCode: 'A01', stopReason: 'Rain' });
  const others = [
    ticketOf(world.tag),
    linkToken(TEST_SECRET, 'ticket', recordId, 1),
    linkToken(TEST_SECRET, 'record', recordId, 2),
    linkToken(TEST_SECRET, 'record', world.tag.id, 1),
    '',
  ];
  for (const token of others) expect(await recordOfToken(store.db, token)).toBeNull();
});
