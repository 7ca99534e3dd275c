import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { beforeEach, describe, expect, it } from 'vitest';
import { benches, meets, tags } from '@/db/schema';
import { pauseBench } from '@/server/commands/bench/set-state';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { tagOfTicket } from '@/server/queries/ticket/by-token';
import { linkToken } from '@/server/access/links';
import { actorOf, makeTag, makeWorld, ticketOf } from '@/tests/support/factories';
import { codeOf, PLATE } from '@/tests/support/line';
import { TEST_SECRET, testStore, type TestStore } from '@/tests/support/store';
import { callTag } from './call';
import { handBack } from './hand-back';
import { hangTool } from './hang';
import { holdTag } from './hold';
import { joinLine } from './join';
import { markAway } from './mark-away';
import { markUnfit } from './mark-unfit';
import { moveInLine } from './move';
import { returnToLine } from './return-to-line';
import { takeOnBench } from './take-on-bench';
import { withdrawTag } from './withdraw';

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
});

const operator = () => store.contextFor(actorOf(world.staff.operator));
const lead = () => store.contextFor(actorOf(world.staff.lead));
const stateOf = async (id: string) =>
  (await store.db.select().from(tags).where(eq(tags.id, id)))[0]!;
const waiting = async () =>
  (await lineSnapshot(store.db, world.meet.id, store.now))!.waiting.map(({ code }) => code);

describe('joining', () => {
  const join = (change: Partial<Parameters<typeof joinLine>[2]> = {}) =>
    joinLine(store.contextFor({ kind: 'public' }), uuidv7(), {
      meetId: world.meet.id,
      tool: PLATE,
      consent: 'maximum',
      visitor: {},
      ...change,
    });

  it('gives the next code at the end of the line, and a ticket that only its token opens', async () => {
    const { tagId, code } = await join();
    expect(code).toBe('A02');
    expect(await waiting()).toEqual(['A01', 'A02']);
    const token = linkToken(TEST_SECRET, 'ticket', tagId, 1);
    expect((await tagOfTicket(store.db, token))?.id).toBe(tagId);
    expect(await tagOfTicket(store.db, linkToken(TEST_SECRET, 'record', tagId, 1))).toBeNull();
    expect(await tagOfTicket(store.db, `${token.slice(0, -1)}x`)).toBeNull();
  });

  it('gives every code once, also to many at the same moment', async () => {
    const codes = await Promise.all(Array.from({ length: 20 }, () => join()));
    expect(new Set(codes.map(({ code }) => code)).size).toBe(20);
  });

  it('takes several tools of one visitor', async () => {
    const { tagId } = await join({ otherTicket: ticketOf(world.tag) });
    expect((await stateOf(tagId)).visitorId).toBe(world.tag.visitorId);
  });

  it('refuses a ticket that is none, a meet that is none, and a closed line', async () => {
    expect(await codeOf(join({ otherTicket: 'guess' }))).toBe('not-found');
    expect(await codeOf(join({ meetId: uuidv7() }))).toBe('not-found');
    await store.db.update(meets).set({ joinOpen: false });
    expect(await codeOf(join())).toBe('wrong-move');
  });

  it('keeps a script in a name as plain text', async () => {
    const { tagId } = await join({ tool: { ...PLATE, maker: '<script>alert(1)</script>' } });
    expect(tagId).toBeTruthy();
  });
});

describe('calling', () => {
  it('takes the first who waits', async () => {
    await makeTag(store.db, 2);
    expect(await callTag(operator(), uuidv7(), { benchId: world.bench.id })).toMatchObject({
      code: 'A01',
      state: 'called',
    });
    expect(await waiting()).toEqual(['A02']);
  });

  it('by two operators at the same moment gives the tag to one, and tells the other', async () => {
    const tagId = world.tag.id;
    const codes = await Promise.all([
      codeOf(callTag(operator(), uuidv7(), { benchId: world.bench.id, tagId })),
      codeOf(callTag(lead(), uuidv7(), { benchId: world.otherBench.id, tagId })),
    ]);
    expect(codes.sort()).toEqual(['conflict', 'done']);
  });

  it('of the next by two benches at once never gives one tag to both', async () => {
    await makeTag(store.db, 2);
    const called = await Promise.all([
      callTag(operator(), uuidv7(), { benchId: world.bench.id }),
      callTag(lead(), uuidv7(), { benchId: world.otherBench.id }),
    ]);
    expect(called.map(({ code }) => code).sort()).toEqual(['A01', 'A02']);
  });

  it('is one at a time for a bench', async () => {
    await makeTag(store.db, 2);
    await callTag(operator(), uuidv7(), { benchId: world.bench.id });
    await expect(callTag(operator(), uuidv7(), { benchId: world.bench.id })).rejects.toThrow(
      'A01 is called to bench 1',
    );
  });

  it('lays a tool that was left with us on the bench at once', async () => {
    await hangTool(operator(), uuidv7(), { tagId: world.tag.id });
    expect(await callTag(operator(), uuidv7(), { benchId: world.bench.id })).toMatchObject({
      state: 'on_bench',
    });
    expect(await stateOf(world.tag.id)).toMatchObject({
      place: 'bench',
      peg: null,
      benchId: world.bench.id,
    });
  });

  it('passes over a held turn, and is refused when nobody else waits', async () => {
    await holdTag(lead(), uuidv7(), { tagId: world.tag.id, minutes: 10 });
    await expect(callTag(operator(), uuidv7(), { benchId: world.bench.id })).rejects.toThrow(
      'Nobody is waiting',
    );
    store.now = new Date(store.now.getTime() + 11 * 60_000);
    expect(await callTag(operator(), uuidv7(), { benchId: world.bench.id })).toMatchObject({
      code: 'A01',
    });
  });

  it('waits while the bench is paused', async () => {
    await pauseBench(operator(), uuidv7(), { benchId: world.bench.id, reason: 'Tea' });
    expect(await codeOf(callTag(operator(), uuidv7(), { benchId: world.bench.id }))).toBe(
      'wrong-move',
    );
  });
});

describe('a visitor who does not come', () => {
  it('is away, comes back, and has the old place again', async () => {
    await makeTag(store.db, 2);
    await callTag(operator(), uuidv7(), { benchId: world.bench.id });
    await markAway(operator(), uuidv7(), { tagId: world.tag.id });
    expect(await stateOf(world.tag.id)).toMatchObject({ state: 'away', benchId: null });
    await returnToLine(operator(), uuidv7(), { tagId: world.tag.id });
    expect(await waiting()).toEqual(['A01', 'A02']);
  });

  it('may leave by the own ticket alone', async () => {
    const other = await makeTag(store.db, 2);
    const visitor = store.contextFor({ kind: 'visitor', tagId: world.tag.id });
    expect(await codeOf(withdrawTag(visitor, uuidv7(), { tagId: other.id }))).toBe('not-found');
    await withdrawTag(visitor, uuidv7(), { tagId: world.tag.id });
    expect(await stateOf(world.tag.id)).toMatchObject({ state: 'withdrawn', place: 'returned' });
    expect(await codeOf(withdrawTag(visitor, uuidv7(), { tagId: world.tag.id }))).toBe(
      'wrong-move',
    );
  });
});

describe('the lead', () => {
  it('moves a tag to a place, with a reason', async () => {
    await makeTag(store.db, 2);
    const third = await makeTag(store.db, 3);
    await moveInLine(lead(), uuidv7(), {
      tagId: third.id,
      place: 1,
      reason: 'Starts in ten minutes',
    });
    expect(await waiting()).toEqual(['A03', 'A01', 'A02']);
    expect(
      await codeOf(moveInLine(lead(), uuidv7(), { tagId: third.id, place: 1, reason: ' ' })),
    ).toBe('invalid');
  });
});

describe('pegs', () => {
  it('hold one tool each', async () => {
    const second = await makeTag(store.db, 2);
    expect(await hangTool(operator(), uuidv7(), { tagId: world.tag.id })).toMatchObject({ peg: 1 });
    expect(await codeOf(hangTool(operator(), uuidv7(), { tagId: second.id, peg: 1 }))).toBe(
      'conflict',
    );
    expect(await hangTool(operator(), uuidv7(), { tagId: second.id })).toMatchObject({ peg: 2 });
  });
});

describe('handing back', () => {
  const onBench = async () => {
    await callTag(operator(), uuidv7(), { benchId: world.bench.id });
    await takeOnBench(operator(), uuidv7(), { benchId: world.bench.id, tagId: world.tag.id });
  };

  it('needs the code of the tool in hand', async () => {
    await onBench();
    await markUnfit(operator(), uuidv7(), { tagId: world.tag.id, reason: 'Cracked head' });
    const give = (ticketCode: string) =>
      handBack(operator(), uuidv7(), { tagId: world.tag.id, ticketCode });
    await expect(give('A02')).rejects.toThrow('Do not hand it over');
    expect(await codeOf(give('A27 please'))).toBe('invalid');
    await give('a 1');
    expect(await stateOf(world.tag.id)).toMatchObject({
      state: 'unfit',
      place: 'returned',
      unfitReason: 'Cracked head',
    });
  });

  it('frees the bench for the next', async () => {
    await onBench();
    await makeTag(store.db, 2);
    await expect(callTag(operator(), uuidv7(), { benchId: world.bench.id })).rejects.toThrow(
      'A01 still lies on bench 1',
    );
    const [bench] = await store.db.select().from(benches).where(eq(benches.id, world.bench.id));
    expect(bench?.state).toBe('open');
  });
});
