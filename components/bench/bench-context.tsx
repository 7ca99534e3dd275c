'use client';

import { createContext, useContext } from 'react';
import type { BenchSnapshot, CheckView } from '@/lib/live/contract';
import type { Role } from '@/lib/line/states';

/** Who is signed in at this screen. */
export interface BenchPerson {
  id: string;
  name: string;
  role: Role;
}

export interface BenchView {
  bench: BenchSnapshot;
  check: CheckView | null;
  me: BenchPerson;
  /** The post is heard. */
  connected: boolean;
  /** Banners take room: what is not needed for the next pull gives way. */
  crowded: boolean;
}

const BenchContext = createContext<BenchView | null>(null);

export const BenchProvider = BenchContext.Provider;

/** The bench that this screen belongs to. @throws Error outside of a bench screen. */
export function useBench(): BenchView {
  const view = useContext(BenchContext);
  if (!view) throw new Error('This belongs on a bench screen.');
  return view;
}
