import type { ConnectionKind } from '@/lib/signal/connection';
import type { PullDirection } from '@/lib/signal/line';

export type { TesterConnection } from '@/lib/signal/connection';

/** How a tester's connection stands. `message` is for the operator, `since` when the state began. */
export interface InstrumentStatus {
  state: 'detached' | 'connecting' | 'ready' | 'lost';
  since: Date;
  message: string;
}

/** One pull as the tester gave it, before any correction. */
export interface InstrumentPull {
  /** Magnitude in N·m, 0 or more. */
  valueNm: number;
  /** null: the tester does not say. */
  direction: PullDirection | null;
  /** The line it came from. */
  raw: string;
  at: Date;
}

/** Something a tester sent that gave no reading. Never dropped in silence. */
export interface InstrumentProblem {
  code: 'unreadable-line' | 'line-too-long' | 'half-line' | 'sent-while-opening';
  /** For the operator: what came, and what to do. */
  message: string;
  /** What came, '' when the message stands for several. */
  raw: string;
  at: Date;
}

/** Every event of an instrument and what it carries. */
export interface InstrumentEvents {
  pull: InstrumentPull;
  status: InstrumentStatus;
  problem: InstrumentProblem;
}

/** A reference tester behind whatever brings its readings in. */
export interface Instrument {
  readonly kind: ConnectionKind;
  /** Starts; resolves at once. Whether the tester answers is told by its status. */
  attach(): Promise<void>;
  /** Stops, and resolves when the port is free again. No pull comes after the call. */
  detach(): Promise<void>;
  status(): InstrumentStatus;
  /** Listens to an event; the function returned stops it. */
  on<Name extends keyof InstrumentEvents>(
    event: Name,
    listener: (payload: InstrumentEvents[Name]) => void,
  ): () => void;
}

/** Runs something after `delayMs` milliseconds; the function returned calls it off. */
export type Schedule = (run: () => void, delayMs: number) => () => void;

/** Time as instruments get it, so that tests need not wait. */
export interface InstrumentTime {
  now: () => Date;
  schedule: Schedule;
}

/** The real timers. They do not keep the process alive. */
export const realSchedule: Schedule = (run, delayMs) => {
  const timer = setTimeout(run, delayMs);
  timer.unref();
  return () => clearTimeout(timer);
};
