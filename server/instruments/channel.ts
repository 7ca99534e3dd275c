import type { Instrument, InstrumentEvents, InstrumentStatus } from './instrument';

type Listeners = {
  [Name in keyof InstrumentEvents]: Set<(payload: InstrumentEvents[Name]) => void>;
};

/** What every kind of instrument shares: its listeners, and its status with the time it began. */
export interface InstrumentChannel extends Pick<Instrument, 'on' | 'status'> {
  emit<Name extends keyof InstrumentEvents>(event: Name, payload: InstrumentEvents[Name]): void;
  /** Sets the status and tells it, unless nothing has changed. */
  become(state: InstrumentStatus['state'], message: string): void;
}

/** A channel in state `detached`. */
export function createChannel(now: () => Date): InstrumentChannel {
  const listeners: Listeners = { pull: new Set(), status: new Set(), problem: new Set() };
  let status: InstrumentStatus = { state: 'detached', since: now(), message: 'Not attached.' };

  const channel: InstrumentChannel = {
    on(event, listener) {
      listeners[event].add(listener);
      return () => listeners[event].delete(listener);
    },
    emit(event, payload) {
      for (const listener of [...listeners[event]]) listener(payload);
    },
    status: () => status,
    become(state, message) {
      if (state === status.state && message === status.message) return;
      status = { state, message, since: state === status.state ? status.since : now() };
      channel.emit('status', status);
    },
  };
  return channel;
}
