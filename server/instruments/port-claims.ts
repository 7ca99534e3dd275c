import { realpathSync } from 'node:fs';
import type { TesterConnection } from '@/lib/signal/connection';

/**
 * What a connection needs for itself: the device behind its serial path, which may have several
 * names; null when it needs nothing.
 */
export function claimedPort(connection: TesterConnection): string | null {
  if (connection.kind !== 'serial') return null;
  try {
    return realpathSync(connection.path);
  } catch {
    // Not plugged in, or a system without files for ports: the name is all there is.
    return connection.path;
  }
}
