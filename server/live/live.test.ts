import { createServer, type Server as HttpServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { sealData } from 'iron-session';
import pino from 'pino';
import { io as connect, type Socket } from 'socket.io-client';
import { v7 as uuidv7 } from 'uuid';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type {
  Ack,
  ClientToServer,
  JoinRoomInput,
  LineSnapshot,
  ServerToClient,
  TicketSnapshot,
} from '@/lib/live/contract';
import { SESSION_COOKIE } from '@/server/access/session';
import { recordPull } from '@/server/commands/pull/record';
import { callTag } from '@/server/commands/tag/call';
import { actorOf, makeTag, makeWorld, ticketOf } from '@/tests/support/factories';
import { checkOnBench } from '@/tests/support/line';
import { TEST_SECRET, testStore, type TestStore } from '@/tests/support/store';
import { createHub, type LiveHub } from './hub';
import { createSocketServer } from './socket';

type Client = Socket<ServerToClient, ClientToServer>;

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;
let http: HttpServer;
let hub: LiveHub;
let sockets: ReturnType<typeof createSocketServer>;
let clients: Client[];

const VISITOR = { name: 'Wren Alder', email: 'wren@example.org', mobile: '+441632960000' };

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
  await makeTag(store.db, 2, { visitor: VISITOR });
  const logger = pino({ level: 'silent' });
  const shared = {
    db: store.db,
    clock: () => store.now,
    secret: TEST_SECRET,
    logger,
    instruments: () => ({ status: () => null }),
  };
  http = createServer();
  hub = createHub({ ...shared, shared: false });
  sockets = createSocketServer({ http, ...shared });
  hub.attach(sockets.io);
  await new Promise<void>((resolve) => http.listen(0, '127.0.0.1', resolve));
  clients = [];
});

afterEach(async () => {
  for (const client of clients) client.disconnect();
  hub.close();
  await sockets.close();
  await new Promise((resolve) => http.close(resolve));
});

const as = (person: { id: string; sessionVersion: number }) => ({
  ...store.contextFor(actorOf(person)),
  publish: hub.publish,
});

async function client(person?: { id: string; sessionVersion: number }): Promise<Client> {
  const headers: Record<string, string> = {};
  if (person) {
    const data = { staffId: person.id, sessionVersion: person.sessionVersion };
    headers.cookie = `${SESSION_COOKIE}=${await sealData(data, { password: TEST_SECRET.slice(0, 64) })}`;
  }
  const { port } = http.address() as AddressInfo;
  const socket: Client = connect(`http://127.0.0.1:${port}`, {
    transports: ['websocket'],
    extraHeaders: headers,
    forceNew: true,
  });
  clients.push(socket);
  await new Promise<void>((resolve) => socket.once('connect', resolve));
  return socket;
}

const enter = (socket: Client, room: JoinRoomInput) =>
  new Promise<Ack>((resolve) => socket.emit('room:join', room, resolve));

function next<Name extends 'line:changed' | 'ticket:changed' | 'check:changed'>(
  socket: Client,
  name: Name,
  when: (snapshot: Parameters<ServerToClient[Name]>[0]) => boolean = () => true,
): Promise<Parameters<ServerToClient[Name]>[0]> {
  return new Promise((resolve) => {
    const listener = (snapshot: Parameters<ServerToClient[Name]>[0]) => {
      if (!when(snapshot)) return;
      socket.off(name, listener as never);
      resolve(snapshot);
    };
    socket.on(name, listener as never);
  });
}

describe('the line room', () => {
  it('shows everybody the newest line on entering, and each change', async () => {
    const board = await client();
    const first = next(board, 'line:changed');
    expect(await enter(board, { room: 'line', meetId: world.meet.id })).toEqual({ ok: true });
    expect((await first).waiting.map(({ code }) => code)).toEqual(['A01', 'A02']);
    const changed = next(board, 'line:changed', ({ waiting }) => waiting.length === 1);
    await callTag(as(world.staff.operator), uuidv7(), { benchId: world.bench.id });
    const snapshot = await changed;
    expect(snapshot.benches[0]!.called?.code).toBe('A01');
    expect(snapshot.revision).toBeGreaterThan((await first).revision);
  });

  it('holds no personal data and no ticket', async () => {
    const board = await client();
    const first = next(board, 'line:changed');
    await enter(board, { room: 'line', meetId: world.meet.id });
    const text = JSON.stringify(await first);
    for (const secret of [...Object.values(VISITOR), ticketOf(world.tag), world.tag.visitorId]) {
      expect(text).not.toContain(secret);
    }
  });

  it('moves a bench’s progress with each pull, without another read of the line', async () => {
    const checkId = await checkOnBench(as(world.staff.operator), world.bench.id, world.tag.id);
    const board = await client();
    await enter(board, { room: 'line', meetId: world.meet.id });
    const moved = next(board, 'line:changed', ({ benches }) => benches[0]!.progress?.done === 2);
    for (let index = 0; index < 2; index += 1) {
      await recordPull(as(world.staff.operator), uuidv7(), { checkId, value: null, unit: 'N.m' });
    }
    expect((await moved).benches[0]!.words).toBe('Exercise pull 3 of 5');
  });
});

describe('the ticket room', () => {
  it('opens to the token alone, and shows each reading as it is taken', async () => {
    const phone = await client();
    expect(await enter(phone, { room: 'ticket', token: 'x'.repeat(43) })).toMatchObject({
      ok: false,
      code: 'not-found',
    });
    const first = next(phone, 'ticket:changed') as Promise<TicketSnapshot>;
    expect(await enter(phone, { room: 'ticket', token: ticketOf(world.tag) })).toEqual({
      ok: true,
    });
    expect(await first).toMatchObject({ code: 'A01', state: 'waiting' });

    const checkId = await checkOnBench(as(world.staff.operator), world.bench.id, world.tag.id);
    for (let index = 0; index < 5; index += 1) {
      await recordPull(as(world.staff.operator), uuidv7(), { checkId, value: null, unit: 'N.m' });
    }
    const reading = next(phone, 'ticket:changed', ({ check }) => check?.readings.length === 1);
    await recordPull(as(world.staff.operator), uuidv7(), { checkId, value: 67.1, unit: 'N.m' });
    expect((await reading).check!.readings).toEqual([
      { label: '68 N·m', reference: '67.1 N·m', words: 'delivers 1.3 % low' },
    ]);
  });
});

describe('the staff’s rooms', () => {
  it('are closed to the public, and the desk to operators', async () => {
    const stranger = await client();
    for (const room of [
      { room: 'check', benchId: world.bench.id },
      { room: 'desk', meetId: world.meet.id },
    ] as const) {
      expect(await enter(stranger, room)).toMatchObject({ ok: false, code: 'sign-in' });
    }
    const operator = await client(world.staff.operator);
    expect(await enter(operator, { room: 'desk', meetId: world.meet.id })).toMatchObject({
      code: 'forbidden',
    });
    expect(await enter(operator, { room: 'check', benchId: world.bench.id })).toEqual({ ok: true });
  });

  it('answer nonsense with a refusal, not with silence', async () => {
    const stranger = await client();
    expect(await enter(stranger, { room: 'attic' } as never)).toMatchObject({
      ok: false,
      code: 'invalid',
    });
  });

  it('put somebody out whose sessions have ended', async () => {
    const operator = await client(world.staff.operator);
    await enter(operator, { room: 'check', benchId: world.bench.id });
    const gone = new Promise((resolve) => operator.once('disconnect', resolve));
    hub.publish([{ kind: 'staff', staffId: world.staff.operator.id }], 1);
    await gone;
  });
});

it('reads no snapshots for a connection that asks without end', async () => {
  const stranger = await client();
  const room = { room: 'line', meetId: world.meet.id } as const;
  const answers = await Promise.all(Array.from({ length: 40 }, () => enter(stranger, room)));
  expect(answers.filter(({ ok }) => ok)).toHaveLength(30);
  expect(answers.at(-1)).toMatchObject({ code: 'too-many' });
  expect(await enter(await client(), room)).toEqual({ ok: true });
});

it('a board that reconnects is given the newest line', async () => {
  const board = await client();
  await enter(board, { room: 'line', meetId: world.meet.id });
  board.disconnect();
  await callTag(as(world.staff.operator), uuidv7(), { benchId: world.bench.id });
  const back = new Promise<void>((resolve) => board.once('connect', resolve));
  board.connect();
  await back;
  const fresh = next(board, 'line:changed') as Promise<LineSnapshot>;
  await enter(board, { room: 'line', meetId: world.meet.id });
  expect((await fresh).waiting.map(({ code }) => code)).toEqual(['A02']);
});
