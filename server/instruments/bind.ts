import { eq, isNotNull } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import type { Logger } from 'pino';
import type { Store } from '@/db/client';
import { benches, testers } from '@/db/schema';
import { convertTorque } from '@/lib/torque/units';
import { recordPull } from '@/server/commands/pull/record';
import type { LiveHub } from '@/server/live/hub';
import { toProblemDocument } from '@/server/problem';
import { factsOf } from '@/server/queries/check/facts';
import { loadCheckFile, type CheckFile } from '@/server/queries/check/load';
import { progressOf } from '@/lib/torque/progress';
import type { InstrumentPull } from './instrument';
import { createInstrumentManager, type InstrumentManager } from './manager';
import { isSimulated } from './simulated';

export interface BoundInstruments extends InstrumentManager {
  /** Attaches the testers of the database, and follows every change from then on. */
  follow(): Promise<void>;
}

interface BindOptions {
  store: Store;
  clock: () => Date;
  secret: string;
  logger: Logger;
  hub: LiveHub;
}

/**
 * Testers and benches: a pull goes to the check that runs on the bench where its own tester stands,
 * through the same command as a typed one, and nowhere else.
 */
export function bindInstruments({
  store,
  clock,
  secret,
  logger,
  hub,
}: BindOptions): BoundInstruments {
  const { db } = store;
  // Pulls of one tester are written one after the other, in the order in which they came.
  const queues = new Map<string, Promise<void>>();

  const manager = createInstrumentManager({
    now: clock,
    logger,
    onPull: (testerId, pull) => {
      const before = queues.get(testerId) ?? Promise.resolve();
      const done = before.then(() => take(testerId, pull));
      queues.set(
        testerId,
        done.catch(() => undefined),
      );
      return done;
    },
    onStatus: (testerId) => hub.instrumentChanged(testerId),
    onProblem: (testerId, problem) => hub.notice(testerId, problem.message),
  });

  async function take(testerId: string, pull: InstrumentPull): Promise<void> {
    const file = await runningCheck(testerId);
    if (!file) {
      hub.notice(
        testerId,
        `The tester sent ${pull.raw.trim()}, but no check is running. It was not taken.`,
      );
      return;
    }
    const context = {
      db,
      actor: { kind: 'tester' as const, testerId },
      clock,
      secret,
      flush: store.flush,
      publish: hub.publish,
    };
    try {
      await recordPull(context, uuidv7(), {
        checkId: file.check.id,
        value: pull.valueNm,
        unit: 'N.m',
        direction: pull.direction,
      });
    } catch (error) {
      const problem = toProblemDocument(error);
      hub.notice(
        testerId,
        `The tester sent ${pull.raw.trim()}. It was not taken: ${problem.detail}`,
      );
      if (problem.code === 'internal') throw error;
    }
  }

  async function runningCheck(testerId: string): Promise<CheckFile | null> {
    const [bench] = await db
      .select({ id: benches.id })
      .from(benches)
      .where(eq(benches.testerId, testerId));
    const file = bench ? await loadCheckFile(db, { runningOnBench: bench.id }) : null;
    return file?.tester.id === testerId ? file : null;
  }

  /** A simulated tester plays what its bench waits for. */
  function expect(testerId: string, file: CheckFile | null): void {
    const instrument = manager.get(testerId);
    if (!instrument || !isSimulated(instrument)) return;
    const index =
      file && !file.check.pausedAt && !file.check.stoppedEarly
        ? progressOf(factsOf(file)).nextStepIndex
        : null;
    const step = file && index !== null ? file.check.plan.steps[index] : undefined;
    instrument.expect(
      step && file
        ? {
            targetNm: convertTorque(step.target, file.check.plan.unit, 'N.m'),
            direction: step.direction,
          }
        : null,
    );
  }

  async function sync(): Promise<void> {
    const rows = await db
      .select({ testerId: testers.id, connection: testers.connection })
      .from(testers)
      .innerJoin(benches, eq(benches.testerId, testers.id))
      .where(isNotNull(benches.testerId));
    await manager.sync(rows);
    for (const { testerId } of rows) expect(testerId, await runningCheck(testerId));
  }

  return {
    ...manager,
    async follow() {
      hub.onEvent((event) => {
        const failed = (error: unknown) =>
          logger.error({ err: error }, 'testers could not be followed');
        if (event.kind === 'check') expect(event.file.tester.id, event.file);
        if (event.kind === 'testers') sync().catch(failed);
        if (event.kind === 'check-ended') {
          db.select({ testerId: benches.testerId })
            .from(benches)
            .where(eq(benches.id, event.benchId))
            .then(([bench]) => bench?.testerId && expect(bench.testerId, null), failed);
        }
      });
      await sync();
    },
  };
}
