'use client';

import clsx from 'clsx';
import type { ReactNode } from 'react';
import { KeyBar } from './key-bar';
import type { BenchAction } from './keys';

interface BenchFrameProps {
  /** What can be done now: keys and buttons of the bottom line. */
  actions: readonly BenchAction[];
  children: ReactNode;
  className?: string;
}

/** The middle of the screen above the key bar. On a bench's screen it fills what is left of it. */
export function BenchFrame({ actions, children, className }: BenchFrameProps) {
  return (
    <>
      <main className={clsx('min-h-0 flex-1 overflow-y-auto', className)}>{children}</main>
      <KeyBar actions={actions} />
    </>
  );
}

/** Left the one thing to do, right what belongs to it. */
export function TwoColumns({ left, right }: { left: ReactNode; right: ReactNode }) {
  return (
    <div className="lg:grid lg:h-full lg:min-h-0 lg:flex-1 lg:grid-cols-[26.5rem_minmax(0,1fr)]">
      <div className="border-line flex min-h-0 flex-col gap-3.5 overflow-y-auto px-6 py-4 lg:border-r">
        {left}
      </div>
      <div className="flex min-h-0 flex-col gap-4 overflow-y-auto px-6 pt-4 pb-3">{right}</div>
    </div>
  );
}
