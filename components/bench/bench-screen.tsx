'use client';

import { LazyMotion, MotionConfig } from 'framer-motion';
import type { ReactNode } from 'react';
import type { BenchSnapshot, CheckSnapshot } from '@/lib/live/contract';
import { QueryProvider } from '../live/query-provider';
import { Loading } from '../ui/loading';
import { Announcer } from './announcer';
import { BenchBanners, hasBanner } from './bench-banners';
import { BenchProvider, useBench, type BenchPerson } from './bench-context';
import { BenchTopBar } from './bench-top-bar';
import { CalledPhase } from './called-phase';
import { ClosedTagPhase } from './closed-tag-phase';
import { FreePhase } from './free-phase';
import { NotMinePhase } from './not-mine-phase';
import { phaseOf } from './phase';
import { PullPhase } from './pull-phase';
import { ReadyPhase } from './ready-phase';
import { ShutPhase } from './shut-phase';
import { SignOffPhase } from './sign-off-phase';
import { StartPhase } from './start-phase';
import { useBenchLive } from './use-bench-live';

interface BenchScreenProps {
  bench: BenchSnapshot;
  check: CheckSnapshot;
  me: BenchPerson;
  signOut: ReactNode;
}

const motionFeatures = () => import('./motion-features').then((module) => module.default);

/** The operator's screen of one bench, from an empty bench to the tool in its owner's hands. */
export function BenchScreen(props: BenchScreenProps) {
  return (
    <QueryProvider>
      <MotionConfig reducedMotion="user">
        <LazyMotion features={motionFeatures} strict>
          <LiveBench {...props} />
        </LazyMotion>
      </MotionConfig>
    </QueryProvider>
  );
}

function LiveBench({ bench: firstBench, check: firstCheck, me, signOut }: BenchScreenProps) {
  const live = useBenchLive({ bench: firstBench, check: firstCheck });
  const { bench, room } = live;
  const { check } = live.check;
  return (
    <BenchProvider
      value={{ bench, check, me, connected: room.connected, crowded: hasBanner(live) }}
    >
      <div className="ground-chalk flex min-h-dvh flex-col lg:h-dvh">
        <BenchTopBar signOut={signOut} />
        <BenchBanners room={room} notice={live.notice} onDismiss={live.dismissNotice} />
        <Announcer check={check} />
        {live.settling ? (
          <main className="flex-1 p-8">
            <Loading label="Just a moment" />
          </main>
        ) : (
          <Phase />
        )}
      </div>
    </BenchProvider>
  );
}

function Phase() {
  const { bench, check, me } = useBench();
  const { tag, tool, called, record } = bench;
  switch (phaseOf(bench, check, me.id)) {
    case 'not-mine':
      return <NotMinePhase />;
    case 'shut':
      return <ShutPhase />;
    case 'free':
      return <FreePhase />;
    case 'called':
      return called && <CalledPhase key={called.id} tag={called} />;
    case 'start':
      return tag && tool && <StartPhase key={tag.id} tag={tag} tool={tool} />;
    case 'pull':
      return check && tag && <PullPhase key={check.id} check={check} tag={tag} />;
    case 'sign-off':
      return check && tag && <SignOffPhase key={check.id} check={check} tag={tag} />;
    case 'ready':
      return tag && <ReadyPhase key={tag.id} tag={tag} record={record} />;
    case 'closed-tag':
      return tag && <ClosedTagPhase key={tag.id} tag={tag} />;
  }
}
