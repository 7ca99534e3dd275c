import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { beforeEach, describe, expect, it } from 'vitest';
import { commandRuns, ledger, tags, tools, visitors } from '@/db/schema';
import { holdTag } from '@/server/commands/tag/hold';
import { joinLine } from '@/server/commands/tag/join';
import { callTag } from '@/server/commands/tag/call';
import { staffCommands } from '@/server/commands';
import { actorOf, fixedId, makeWorld } from '@/tests/support/factories';
import { codeOf, PLATE } from '@/tests/support/line';
import { testStore, type TestStore } from '@/tests/support/store';

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
});

const lead = () => store.contextFor(actorOf(world.staff.lead));
const PERSON = { name: 'Wren Alder', email: 'wren@example.org', mobile: '+44 1632 960000' };
const joinInput = () => ({
  meetId: world.meet.id,
  tool: PLATE,
  consent: 'maximum' as const,
  visitor: PERSON,
});

describe('a command that is sent twice', () => {
  it('runs once, and answers the same', async () => {
    const id = uuidv7();
    const ctx = store.contextFor({ kind: 'public' });
    const first = await joinLine(ctx, id, joinInput());
    const second = await joinLine(ctx, id, joinInput());
    expect(second).toEqual(first);
    expect(await store.db.select().from(tags)).toHaveLength(2);
    expect(store.published).toHaveLength(1);
  });

  it('runs once also when both come at the same moment', async () => {
    const id = uuidv7();
    const ctx = store.contextFor({ kind: 'public' });
    const [first, second] = await Promise.all([
      joinLine(ctx, id, joinInput()),
      joinLine(ctx, id, joinInput()),
    ]);
    expect(second).toEqual(first);
    expect(await store.db.select().from(tags)).toHaveLength(2);
  });

  it('is refused with other content', async () => {
    const id = uuidv7();
    await holdTag(lead(), id, { tagId: world.tag.id, minutes: 5 });
    expect(await codeOf(holdTag(lead(), id, { tagId: world.tag.id, minutes: 50 }))).toBe(
      'key-reused',
    );
  });

  it('belongs to its actor: the same id of another person is another command', async () => {
    const id = uuidv7();
    await holdTag(lead(), id, { tagId: world.tag.id, minutes: 5 });
    const owner = store.contextFor(actorOf(world.staff.owner));
    await holdTag(owner, id, { tagId: world.tag.id, minutes: 50 });
    expect(await store.db.select().from(commandRuns)).toHaveLength(2);
  });

  it('needs an id', async () => {
    expect(await codeOf(holdTag(lead(), 'again', { tagId: world.tag.id, minutes: 5 }))).toBe(
      'invalid',
    );
  });
});

describe('a command that is refused', () => {
  it('changes nothing, tells nobody and can be sent again', async () => {
    const id = uuidv7();
    const input = { tagId: fixedId('tag', 99), minutes: 5 };
    expect(await codeOf(holdTag(lead(), id, input))).toBe('not-found');
    expect(await store.db.select().from(ledger)).toEqual([]);
    expect(await store.db.select().from(commandRuns)).toEqual([]);
    expect(store.published).toEqual([]);
  });

  it('names every field that is wrong', async () => {
    const input = { ...joinInput(), tool: { ...PLATE, rangeMin: -1, rangeMax: Number.NaN } };
    await expect(
      joinLine(store.contextFor({ kind: 'public' }), uuidv7(), input),
    ).rejects.toMatchObject({
      code: 'invalid',
      extra: {
        fields: {
          'tool.rangeMin': expect.stringContaining('above zero'),
          'tool.rangeMax': expect.any(String),
        },
      },
    });
  });
});

describe('a text that the store cannot keep', () => {
  it.each(['Wren\u0000', 'Wren \ud83d'])('is refused in words: %j', async (name) => {
    const input = { ...joinInput(), visitor: { name } };
    await expect(
      joinLine(store.contextFor({ kind: 'public' }), uuidv7(), input),
    ).rejects.toMatchObject({ code: 'invalid', message: expect.stringContaining('character') });
  });
});

it('that the disk did not take never says that nothing was changed, and can be sent again', async () => {
  const ctx = lead();
  const id = uuidv7();
  const input = { tagId: world.tag.id, minutes: 5 };
  const broken = { ...ctx, flush: () => Promise.reject(new Error('EIO')) };
  await expect(holdTag(broken, id, input)).rejects.toMatchObject({
    code: 'internal',
    message: expect.stringContaining('disk'),
    cause: expect.objectContaining({ message: 'EIO' }),
  });
  expect(await codeOf(holdTag(ctx, id, input))).toBe('done');
});

it('the commands of the wire are those of the list, and no word of the language', () => {
  expect(staffCommands.get('tag.hold')).toBe(holdTag.fromWire);
  for (const word of ['constructor', '__proto__', 'toString', 'valueOf']) {
    expect(staffCommands.get(word)).toBeUndefined();
  }
});

describe('the ledger', () => {
  it('holds one entry a command, in its transaction, and a revision that only grows', async () => {
    await callTag(lead(), uuidv7(), { benchId: world.bench.id });
    const [entry] = await store.db.select().from(ledger);
    expect(entry).toMatchObject({
      actor: `staff:${world.staff.lead.id}`,
      command: 'tag.call',
      meetId: world.meet.id,
      subjectId: world.tag.id,
      detail: { code: 'A01', state: 'called' },
    });
    expect(store.published[0]!.revision).toBe(entry!.sequence);
  });

  it('and the store of results hold no personal data', async () => {
    await joinLine(store.contextFor({ kind: 'public' }), uuidv7(), joinInput());
    const written = JSON.stringify([
      await store.db.select().from(ledger),
      await store.db.select().from(commandRuns),
      await store.db.select().from(tags),
      await store.db.select().from(tools),
    ]);
    for (const secret of Object.values(PERSON)) expect(written).not.toContain(secret);
    expect(
      await store.db.select().from(visitors).where(eq(visitors.email, PERSON.email)),
    ).toHaveLength(1);
  });

  it('cannot be altered', async () => {
    await callTag(lead(), uuidv7(), { benchId: world.bench.id });
    await expect(store.db.delete(ledger)).rejects.toMatchObject({
      cause: { message: expect.stringContaining('append-only') },
    });
    await expect(store.db.update(ledger).set({ actor: 'nobody' })).rejects.toThrow();
  });
});
