'use client';

import { useSyncExternalStore } from 'react';
import { TORQUE_UNITS, type TorqueUnit } from '@/lib/torque/units';

const keyOf = (testerId: string): string => `pullpost.unit.${testerId}`;
const listeners = new Set<() => void>();

function read(testerId: string): TorqueUnit {
  try {
    const kept = localStorage.getItem(keyOf(testerId));
    return TORQUE_UNITS.find((unit) => unit === kept) ?? 'N.m';
  } catch {
    return 'N.m';
  }
}

const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => {
    listeners.delete(listener);
  };
};

/** The unit that a tester's display shows, as this screen was last told; N·m at first. */
export function useTesterUnit(testerId: string): [TorqueUnit, (unit: TorqueUnit) => void] {
  const unit = useSyncExternalStore(
    subscribe,
    () => read(testerId),
    () => 'N.m' as const,
  );
  const keep = (next: TorqueUnit) => {
    try {
      localStorage.setItem(keyOf(testerId), next);
    } catch {
      // Without storage it is asked again on the next visit.
    }
    for (const listener of listeners) listener();
  };
  return [unit, keep];
}
