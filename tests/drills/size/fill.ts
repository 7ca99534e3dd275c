import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import type { PGlite } from '@electric-sql/pglite';
import type { Database } from '@/db/client';
import { checks, records } from '@/db/schema';
import { tagCode } from '@/lib/line/code';
import type { CommandContext } from '@/server/commands/command';
import { signOff } from '@/server/commands/check/sign-off';
import { handBack } from '@/server/commands/tag/hand-back';
import { makeTag, type makeWorld } from '../../support/factories';
import { checkOnBench } from '../../support/line';
import { TEST_NOW } from '../../support/store';
import { pullAll } from '../one-check';
import { fillStatements, PREPARE, type FillFacts } from './fill-sql';

export const MEETS = 200;
export const RECORDS_A_MEET = 500;
/** Tags of the current meet that are still in the line. */
const WAITING = 60;
const ON_PEGS = 12;
const AWAY = 6;

export type World = Awaited<ReturnType<typeof makeWorld>>;

/** One check by the commands: its record is what all others are copied from. */
async function firstRecord(ctx: CommandContext, world: World) {
  const { db } = ctx;
  const checkId = await checkOnBench(ctx, world.bench.id, world.tag.id);
  await pullAll(ctx, checkId);
  const { recordId } = await signOff(ctx, uuidv7(), { checkId });
  await handBack(ctx, uuidv7(), { tagId: world.tag.id, ticketCode: world.tag.code });
  const [record] = await db.select().from(records).where(eq(records.id, recordId));
  const [check] = await db.select().from(checks).where(eq(checks.id, checkId));
  return { record: record!, check: check! };
}

/** The tags of the current meet that have not gone home. */
async function fillLine(db: Database): Promise<number> {
  let number = RECORDS_A_MEET + 2;
  const next = () => (number += 1);
  for (let count = 0; count < WAITING; count += 1) await makeTag(db, next());
  for (let peg = 1; peg <= ON_PEGS; peg += 1) {
    await makeTag(db, next(), { state: 'ready', place: 'peg', peg });
  }
  for (let count = 0; count < AWAY; count += 1) await makeTag(db, next(), { state: 'away' });
  return number;
}

/**
 * Fills the store of `world` with three years of a busy post: 200 meets of 500 records each, the last
 * of them the current one with a line of 78 tags. Bulk SQL, but for the first record.
 */
export async function fillStore(
  client: PGlite,
  ctx: CommandContext,
  world: World,
  checksWithPulls: number,
  say: (words: string) => void,
): Promise<{ bytesARecord: number; rows: Record<string, number> }> {
  const { record, check } = await firstRecord(ctx, world);
  const issued = await fillLine(ctx.db);
  const facts: FillFacts = {
    meets: MEETS,
    recordsAMeet: RECORDS_A_MEET,
    now: TEST_NOW.toISOString(),
    codes: Array.from({ length: RECORDS_A_MEET }, (_, index) => tagCode(index + 2)),
    checkId: check.id,
    recordId: record.id,
    meetId: world.meet.id,
    testerId: world.tester.id,
    staffIds: Object.values(world.staff).map(({ id }) => id),
    checksWithPulls,
    issued,
  };
  // As a replica no foreign key is looked up, row by row: the rows fit each other by construction.
  await client.exec(`set session_replication_role = replica; ${PREPARE}`);
  const rows: Record<string, number> = {};
  for (const { table, text, params } of fillStatements(facts)) {
    const began = performance.now();
    const { affectedRows = 0 } = await client.query(text, params);
    rows[table] = (rows[table] ?? 0) + affectedRows;
    say(`${affectedRows} rows into ${table} in ${Math.round(performance.now() - began)} ms`);
  }
  await client.exec('set session_replication_role = origin');
  return { bytesARecord: Buffer.byteLength(record.canonical), rows };
}
