import type { TesterConnection } from '@/lib/signal/connection';
import type { Instrument, InstrumentTime } from './instrument';
import { createKeyedInstrument } from './keyed';
import type { OpenPort } from './open-port';
import { createSerialInstrument } from './serial';
import { createSimulatedInstrument } from './simulated';

export interface InstrumentDependencies extends InstrumentTime {
  openPort?: OpenPort;
  /** Whether simulated testers play each expected pull by themselves. */
  autoplay?: boolean;
}

/**
 * The instrument of a tester's connection, not attached yet.
 * @throws RangeError when the connection cannot be used (line pattern, seed).
 */
export function createInstrument(
  connection: TesterConnection,
  dependencies: InstrumentDependencies,
): Instrument {
  switch (connection.kind) {
    case 'keyed':
      return createKeyedInstrument(dependencies);
    case 'simulated':
      return createSimulatedInstrument(connection, dependencies);
    case 'serial':
      return createSerialInstrument(connection, dependencies);
  }
}
