'use client';

import type { ReactNode } from 'react';
import { TopBar } from '../ui/top-bar';
import { useBench } from './bench-context';

/** Bench, tester, proof and certificate; how many wait; who works here. */
export function BenchTopBar({ signOut }: { signOut: ReactNode }) {
  const { bench, me } = useBench();
  const { tester } = bench;
  const facts = tester
    ? [`Tester ${tester.name}`, `to ${tester.maximum}`, tester.proof, tester.certificate]
    : ['No tester stands here'];
  return (
    <TopBar
      title={`Bench ${bench.bench.number}`}
      isHeading
      detail={
        <span className="flex flex-wrap items-center gap-x-3">
          {facts.join(' · ')}
          {tester?.kind === 'simulated' && (
            <strong className="text-fore border-fore rounded-sm border px-2">Simulated</strong>
          )}
        </span>
      }
    >
      <span className="text-fore-quiet">{bench.waitingCount} waiting</span>
      <span>{me.name}</span>
      {signOut}
    </TopBar>
  );
}
