import { isDeepStrictEqual } from 'node:util';
import type { TesterConnection } from '@/lib/signal/connection';
import { createInstrument } from './create';
import {
  realSchedule,
  type Instrument,
  type InstrumentProblem,
  type InstrumentPull,
  type InstrumentStatus,
  type Schedule,
} from './instrument';
import type { OpenPort } from './open-port';
import { claimedPort } from './port-claims';

export interface ManagedTester {
  testerId: string;
  connection: TesterConnection;
}

export interface InstrumentManagerOptions {
  now: () => Date;
  /** A pino logger, or anything with these two. */
  logger: {
    info(details: object, message: string): void;
    error(details: object, message: string): void;
  };
  onPull(testerId: string, pull: InstrumentPull): void | Promise<void>;
  onStatus(testerId: string, status: InstrumentStatus): void | Promise<void>;
  onProblem(testerId: string, problem: InstrumentProblem): void | Promise<void>;
  schedule?: Schedule;
  openPort?: OpenPort;
  /** Whether simulated testers play each expected pull by themselves. Off unless set. */
  autoplay?: boolean;
}

/** Every tester of the post, attached; each event carries the id of its own tester. */
export interface InstrumentManager {
  /**
   * Makes the attached testers those of the list: new and changed ones are attached, missing ones
   * detached, the rest left alone. Calls are done one after the other.
   * @throws RangeError when a tester stands in the list twice.
   */
  sync(testers: readonly ManagedTester[]): Promise<void>;
  /** The tester's instrument; null when it is unknown or was refused (see its status). */
  get(testerId: string): Instrument | null;
  /** null for a tester that is not in the list. */
  status(testerId: string): InstrumentStatus | null;
  /** Detaches everything; the manager is of no more use. */
  close(): Promise<void>;
}

interface Entry {
  connection: TesterConnection;
  instrument: Instrument | null;
  /** Why there is no instrument. */
  refusal: InstrumentStatus | null;
}

export function createInstrumentManager(options: InstrumentManagerOptions): InstrumentManager {
  const { now, logger, openPort, autoplay, schedule = realSchedule } = options;
  const entries = new Map<string, Entry>();
  let queue: Promise<void> = Promise.resolve();
  let closed = false;

  /** A failing listener must neither stop the tester nor hide what it was told. */
  function hand<Payload>(
    name: string,
    listener: (testerId: string, payload: Payload) => void | Promise<void>,
    testerId: string,
    payload: Payload,
  ): void {
    const failed = (error: unknown) =>
      logger.error({ err: error, testerId, [name]: payload }, `a tester's ${name} was not handled`);
    try {
      void Promise.resolve(listener(testerId, payload)).catch(failed);
    } catch (error) {
      failed(error);
    }
  }

  function tellStatus(testerId: string, status: InstrumentStatus): void {
    logger.info({ testerId, state: status.state, message: status.message }, 'tester status');
    hand('status', options.onStatus, testerId, status);
  }

  function refuse(testerId: string, connection: TesterConnection, message: string): void {
    const before = entries.get(testerId)?.refusal;
    const refusal: InstrumentStatus =
      before?.message === message ? before : { state: 'lost', since: now(), message };
    entries.set(testerId, { connection, instrument: null, refusal });
    if (refusal !== before) tellStatus(testerId, refusal);
  }

  async function attach({ testerId, connection }: ManagedTester): Promise<void> {
    let instrument: Instrument;
    try {
      instrument = createInstrument(connection, { now, schedule, openPort, autoplay });
    } catch (error) {
      return refuse(testerId, connection, error instanceof Error ? error.message : String(error));
    }
    entries.set(testerId, { connection, instrument, refusal: null });
    instrument.on('pull', (pull) => hand('pull', options.onPull, testerId, pull));
    instrument.on('problem', (problem) => hand('problem', options.onProblem, testerId, problem));
    instrument.on('status', (status) => tellStatus(testerId, status));
    await instrument.attach();
  }

  async function apply(testers: readonly ManagedTester[]): Promise<void> {
    const wanted = new Map(testers.map((tester) => [tester.testerId, tester]));
    for (const [testerId, entry] of entries) {
      const connection = wanted.get(testerId)?.connection;
      if (entry.instrument && !isDeepStrictEqual(connection, entry.connection)) {
        await entry.instrument.detach();
        entries.delete(testerId);
      } else if (!connection) {
        entries.delete(testerId);
      }
    }
    const claims = new Map<string, string>();
    for (const [testerId, { instrument, connection }] of entries) {
      const port = instrument && claimedPort(connection);
      if (port) claims.set(port, testerId);
    }
    for (const tester of wanted.values()) {
      if (entries.get(tester.testerId)?.instrument) continue;
      const port = claimedPort(tester.connection);
      if (port && claims.has(port)) {
        refuse(tester.testerId, tester.connection, `${port} is already used by another tester.`);
      } else {
        if (port) claims.set(port, tester.testerId);
        await attach(tester);
      }
    }
  }

  function enqueue(testers: readonly ManagedTester[]): Promise<void> {
    const done = queue.then(() => apply(testers));
    queue = done.catch(() => {});
    return done;
  }

  return {
    async sync(testers) {
      if (closed) throw new Error('The testers are closed.');
      if (new Set(testers.map(({ testerId }) => testerId)).size < testers.length) {
        throw new RangeError('A tester stands in the list twice.');
      }
      await enqueue(testers);
    },
    get: (testerId) => entries.get(testerId)?.instrument ?? null,
    status(testerId) {
      const entry = entries.get(testerId);
      return entry?.refusal ?? entry?.instrument?.status() ?? null;
    },
    close() {
      closed = true;
      return enqueue([]);
    },
  };
}
