'use client';

import { useEffect, useState } from 'react';
import type { BenchSnapshot, CheckSnapshot } from '@/lib/live/contract';
import { useNewest, useRoom, type RoomState } from '../live/use-room';

export interface BenchNotice {
  at: string;
  words: string;
}

export interface BenchLive {
  bench: BenchSnapshot;
  check: CheckSnapshot;
  room: RoomState;
  /** The check has ended, and what the bench shows was read before that. */
  settling: boolean;
  notice: BenchNotice | null;
  dismissNotice: () => void;
}

/** Longest wait for the bench to be told anew after its check ended. */
const SETTLE_MS = 2000;

/** The bench and its check, kept live from the first snapshots on. */
export function useBenchLive(first: { bench: BenchSnapshot; check: CheckSnapshot }): BenchLive {
  const [bench, offerBench] = useNewest(first.bench);
  const [check, offerCheck] = useNewest(first.check);
  const [endedAt, setEndedAt] = useState<number | null>(null);
  const [notice, setNotice] = useState<BenchNotice | null>(null);

  const room = useRoom(
    { room: 'check', benchId: first.bench.bench.id },
    {
      'bench:changed': offerBench,
      'check:changed': (next) => {
        if (check.check && !next.check) setEndedAt(next.revision);
        offerCheck(next);
      },
      'bench:noticed': setNotice,
    },
  );

  const settling = endedAt !== null && bench.revision < endedAt;
  useEffect(() => {
    if (!settling) return;
    const timer = setTimeout(() => setEndedAt(null), SETTLE_MS);
    return () => clearTimeout(timer);
  }, [settling]);

  return { bench, check, room, settling, notice, dismissNotice: () => setNotice(null) };
}
