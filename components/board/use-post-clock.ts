'use client';

import { useCallback, useEffect, useState } from 'react';

/** The board's own clock may be wrong: smaller differences are the time that a message travels. */
const TOLERANCE_MS = 1500;

/**
 * The post's clock on this screen, ticking once a second from `initialAt` (ISO 8601). `sync` takes
 * the time of each message; `atPost` turns a moment of this screen's clock into the post's.
 */
export function usePostClock(initialAt: string) {
  const [offsetMs, setOffsetMs] = useState(0);
  const [now, setNow] = useState(() => new Date(initialAt));

  useEffect(() => {
    const timer = setInterval(() => setNow(new Date(Date.now() + offsetMs)), 1000);
    return () => clearInterval(timer);
  }, [offsetMs]);

  const sync = useCallback((at: string) => {
    const measured = Date.parse(at) - Date.now();
    setOffsetMs((before) => (Math.abs(before - measured) < TOLERANCE_MS ? before : measured));
  }, []);
  const atPost = (moment: Date): Date => new Date(moment.getTime() + offsetMs);
  return { now, sync, atPost };
}
