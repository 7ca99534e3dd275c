import { v7 as uuidv7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Actor, Standing } from '@/server/access/actor';
import { allows, POLICY, type Permission } from '@/server/access/policy';
import { actorOf, fixedId, makeWorld } from '@/tests/support/factories';
import { codeOf } from '@/tests/support/line';
import { testStore, type TestStore } from '@/tests/support/store';
import type { CommandContext } from './command';

interface AnyCommand {
  commandName: Permission;
  fromWire: (ctx: CommandContext, id: string, input: unknown) => Promise<unknown>;
}

const isCommand = (value: unknown): value is AnyCommand =>
  typeof value === 'function' && 'commandName' in value && 'fromWire' in value;

const modules = import.meta.glob<Record<string, unknown>>(['./*/*.ts', '!./*/*.test.ts'], {
  eager: true,
});
const commands = Object.values(modules).flatMap((module) =>
  Object.values(module).filter(isCommand),
);

let store: TestStore;
let actors: Record<Standing, Actor>;

beforeAll(async () => {
  store = await testStore();
  await store.reset();
  const world = await makeWorld(store.db);
  actors = {
    public: { kind: 'public' },
    visitor: { kind: 'visitor', tagId: world.tag.id },
    tester: { kind: 'tester', testerId: world.tester.id },
    job: { kind: 'job', name: 'test' },
    operator: actorOf(world.staff.operator),
    lead: actorOf(world.staff.lead),
    owner: actorOf(world.staff.owner),
  };
});

describe('every command is open to those of the policy table, and to nobody else', () => {
  for (const command of commands) {
    for (const standing of [
      'public',
      'visitor',
      'tester',
      'job',
      'operator',
      'lead',
      'owner',
    ] as const) {
      const allowed = allows(command.commandName, standing);
      it(`${command.commandName} ${allowed ? 'takes' : 'refuses'} ${standing}`, async () => {
        // An empty input gets no further than the form: who may is asked before.
        const code = await codeOf(
          command.fromWire(store.contextFor(actors[standing]), uuidv7(), {}),
        );
        if (allowed) expect(['invalid', 'not-found', 'wrong-move', 'done']).toContain(code);
        else expect(code).toBe(standing === 'public' ? 'sign-in' : 'forbidden');
      });
    }
  }
});

it('every permission of the table belongs to a command or a staff query', () => {
  const names = new Set<string>(commands.map((command) => command.commandName));
  const loose = Object.keys(POLICY).filter((name) => !name.startsWith('read.') && !names.has(name));
  expect(loose).toEqual([]);
});

it('a session from before a demotion, a sign-out everywhere or a switched-off account is worth nothing', async () => {
  const stale: Actor = { kind: 'staff', staffId: fixedId('staff', 3), sessionVersion: 0 };
  for (const command of commands) {
    expect(await codeOf(command.fromWire(store.contextFor(stale), uuidv7(), {}))).toBe('sign-in');
  }
});
