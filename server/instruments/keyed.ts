import { createChannel } from './channel';
import type { Instrument, InstrumentTime } from './instrument';

/** A tester without a cable: its readings are typed at the bench, so it never gives a pull. */
export function createKeyedInstrument({ now }: Pick<InstrumentTime, 'now'>): Instrument {
  const channel = createChannel(now);
  return {
    kind: 'keyed',
    attach: async () => channel.become('ready', 'Readings are typed in.'),
    detach: async () => channel.become('detached', 'Not attached.'),
    status: channel.status,
    on: channel.on,
  };
}
