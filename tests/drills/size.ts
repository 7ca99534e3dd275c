import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { parseArgs } from 'node:util';
import { openStore } from '@/db/client';
import { tags } from '@/db/schema';
import type { CommandContext } from '@/server/commands/command';
import { actorOf, makeWorld } from '../support/factories';
import { TEST_NOW, TEST_SECRET } from '../support/store';
import { callAndTake, check, finish, join, type Cast, type Play } from './size/commands';
import { fillStore } from './size/fill';
import { sceneResult, type Scene } from './size/scene';
import { screens } from './size/screens';
import { clientOf, watchStatements } from './size/statements';

/** No statement of a request may take longer at 100,000 records, milliseconds. */
const LIMIT_MS = 50;
const ROUNDS = 9;

const say = (words: string): void => void process.stderr.write(`${words}\n`);

const { values: flags } = parseArgs({
  // PGlite never analyses by itself; a PostgreSQL server does. The planner chooses by what it knows.
  options: {
    analysed: { type: 'boolean', default: false },
    /** How many of the newest checks have their pulls in the store; fewer are filled in faster. */
    pulls: { type: 'string', default: '100000' },
  },
});

async function main(): Promise<void> {
  const store = await openStore({ kind: 'memory' });
  const { db } = store;
  const world = await makeWorld(db);
  const client = clientOf(db);
  // Each command finds the clock a second further on.
  let ticks = 0;
  const clock = () => new Date(TEST_NOW.getTime() + (ticks += 1) * 1000);
  const stage = { db, clock, secret: TEST_SECRET, publish: () => undefined };
  const operator = actorOf(world.staff.operator);
  const cast: Cast = {
    operator,
    lead: actorOf(world.staff.lead),
    tester: { kind: 'tester', testerId: world.tester.id },
  };

  const filled = await fillStore(
    client,
    { ...stage, actor: operator },
    world,
    Number(flags.pulls),
    say,
  );
  if (flags.analysed) await client.exec('analyze');

  const { during } = watchStatements(client);
  const scenes = new Map<string, Scene>();
  async function keep<Result>(name: string, work: () => Promise<Result>): Promise<Result> {
    const { result, statements } = await during(work);
    const scene = scenes.get(name) ?? { name, runs: [] };
    scenes.set(name, { name, runs: [...scene.runs, statements] });
    return result;
  }
  const play: Play = (command, actor, input) => {
    const ctx: CommandContext = { ...stage, actor };
    return keep(`command ${command.commandName}`, () => command(ctx, uuidv7(), input));
  };

  let recordId = '';
  // Round 0 warms up, and makes the record that the record page shows.
  for (let round = 0; round <= ROUNDS; round += 1) {
    const waiting = await join(play, world);
    const tagId = await callAndTake(play, world, cast);
    const readScreens = async () => {
      if (recordId === '') return;
      const ids = { waiting, onBench: tagId, returned: world.tag.id };
      const facts = { reader: db, world, now: clock(), secret: TEST_SECRET, operator };
      for (const [name, read] of screens({ ...facts, tags: ids, recordId })) {
        if ((await keep(`screen ${name}`, read)) === null) throw new Error(`${name} has no view.`);
      }
    };
    const checkId = await check(play, { world, db, cast, tagId }, readScreens);
    const [tag] = await db.select().from(tags).where(eq(tags.id, tagId));
    recordId = await finish(play, { cast, checkId, tag: tag! });
    if (round === 0) scenes.clear();
    say(round === 0 ? 'warm' : `round ${round} of ${ROUNDS}`);
  }

  const results = [...scenes.values()]
    .map((scene) => sceneResult(scene, LIMIT_MS))
    .sort((one, other) => other.slowest.medianMs - one.slowest.medianMs);
  const met = results.every((result) => result.met);
  const { analysed } = flags;
  const report = { node: process.version, limitMs: LIMIT_MS, analysed, ...filled, results, met };
  process.stdout.write(`${JSON.stringify(report, null, 2)}\n`);
  for (const { name, slowest } of results.filter((result) => !result.met)) {
    say(`MISSED ${name}: ${slowest.medianMs} ms`);
  }
  process.exit(met ? 0 : 1);
}

main().catch((error: unknown) => {
  console.error(error);
  process.exit(1);
});
