import type { SimulatedConnection } from '@/lib/signal/connection';
import { parseTesterLine, type PullDirection } from '@/lib/signal/line';
import { DEFAULT_LINE_PATTERN } from '@/lib/signal/pattern';
import { mulberry32 } from '@/lib/signal/random';
import { simulateDelivered } from '@/lib/signal/simulated-tool';
import { createChannel } from './channel';
import type { Instrument, InstrumentTime } from './instrument';

/** What the bench is waiting for. */
export interface ExpectedPull {
  /** N·m, above 0. */
  targetNm: number;
  direction: PullDirection;
}

export interface SimulatedPull extends ExpectedPull {
  /** What the tool says, N·m: its setting or its display. The target when left out. */
  toolValueNm?: number;
}

/** A made-up tool on a made-up tester, for the rehearsal. Its status always says so. */
export interface SimulatedInstrument extends Instrument {
  readonly kind: 'simulated';
  /**
   * Plays one pull; it comes after the tester's seconds a pull. False when not attached, or a pull
   * is already under way.
   * @throws RangeError when a torque is not above 0, or beyond any hand tool.
   */
  play(pull: SimulatedPull): boolean;
  /**
   * Says what the bench waits for, null for nothing. Each call stands for one pull: with autoplay
   * on it is played. A pull under way towards something else is called off.
   */
  expect(target: ExpectedPull | null): void;
  /** Plays one pull at what is expected. False when nothing is, or as for `play`. */
  trigger(): boolean;
  setAutoplay(on: boolean): void;
}

/** N·m; beyond any hand tool. */
const MAX_TORQUE_NM = 100_000;

/** Significant digits that the simulated tester shows. */
const DISPLAY_DIGITS = 5;

/**
 * A simulated tester. The same seed and the same pulls give the same readings.
 * @throws RangeError when the seed is not a whole number.
 */
export function createSimulatedInstrument(
  connection: SimulatedConnection,
  { now, schedule, autoplay = false }: InstrumentTime & { autoplay?: boolean },
): SimulatedInstrument {
  const channel = createChannel(now);
  const random = mulberry32(connection.seed);
  let expected: ExpectedPull | null = null;
  let underWay: { pull: SimulatedPull; cancel: () => void } | null = null;
  let owed = false;
  let playsByItself = autoplay;

  function finish(pull: SimulatedPull): void {
    underWay = null;
    owed = false;
    const deliveredNm = simulateDelivered(pull.toolValueNm ?? pull.targetNm, connection, random);
    const raw = displayLine(deliveredNm, pull.direction);
    const parsed = parseTesterLine(raw, { pattern: DEFAULT_LINE_PATTERN, unit: 'N.m' });
    if (!parsed.ok) throw new Error(`The simulated tester wrote '${raw}': ${parsed.reason}.`);
    const { valueNm, direction } = parsed;
    channel.emit('pull', { valueNm, direction, raw, at: now() });
  }

  function callOff(): void {
    underWay?.cancel();
    underWay = null;
  }

  const instrument: SimulatedInstrument = {
    kind: 'simulated',
    status: channel.status,
    on: channel.on,
    attach: async () => {
      channel.become('ready', 'Simulated tester: these are not real readings.');
    },
    detach: async () => {
      callOff();
      expected = null;
      owed = false;
      channel.become('detached', 'Not attached.');
    },
    play(pull) {
      for (const torqueNm of [pull.targetNm, pull.toolValueNm ?? pull.targetNm]) {
        if (!(torqueNm > 0 && torqueNm <= MAX_TORQUE_NM)) {
          throw new RangeError(
            `A simulated pull needs more than 0 and at most ${MAX_TORQUE_NM} N·m, not ${torqueNm}.`,
          );
        }
      }
      if (channel.status().state !== 'ready' || underWay) return false;
      const cancel = schedule(() => finish(pull), connection.secondsPerPull * 1000);
      underWay = { pull, cancel };
      return true;
    },
    expect(target) {
      expected = target;
      owed = target !== null;
      if (underWay && !isTowards(underWay.pull, target)) callOff();
      if (playsByItself) instrument.trigger();
    },
    trigger: () => expected !== null && instrument.play(expected),
    setAutoplay(on) {
      playsByItself = on;
      if (on && owed) instrument.trigger();
    },
  };
  return instrument;
}

/** Whether an instrument can be told what to expect, and triggered. */
export function isSimulated(instrument: Instrument): instrument is SimulatedInstrument {
  return instrument.kind === 'simulated';
}

function isTowards(pull: SimulatedPull, target: ExpectedPull | null): boolean {
  return pull.targetNm === target?.targetNm && pull.direction === target.direction;
}

/** The line a tester would send, to its display's digits and never in powers of ten. */
function displayLine(torqueNm: number, direction: PullDirection): string {
  const whole = Math.max(1, Math.floor(Math.log10(torqueNm)) + 1);
  const text = torqueNm.toFixed(Math.max(0, DISPLAY_DIGITS - whole));
  return `${direction === 'cw' ? '+' : '-'}${text} N.m`;
}
