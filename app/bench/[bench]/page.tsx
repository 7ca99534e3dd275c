import type { Metadata } from 'next';
import { notFound, redirect } from 'next/navigation';
import { z } from 'zod';
import { BenchScreen } from '@/components/bench/bench-screen';
import { SignOut } from '@/app/bench/_components/sign-out';
import { currentStaff } from '@/server/access/current';
import { benchSnapshot } from '@/server/queries/bench/snapshot';
import { checkSnapshot } from '@/server/queries/check/snapshot';
import { getRuntime } from '@/server/runtime';

export const metadata: Metadata = { title: 'Bench' };

/** The operator's screen of one bench. */
export default async function BenchPage({ params }: { params: Promise<{ bench: string }> }) {
  const { bench: benchId } = await params;
  const person = await currentStaff();
  if (!person) redirect(`/sign-in?next=${encodeURIComponent(`/bench/${benchId}`)}`);
  if (!z.uuid().safeParse(benchId).success) notFound();
  const { store, clock, secret, instruments } = getRuntime();
  const now = clock();
  const bench = await benchSnapshot({ reader: store.db, now, secret, instruments }, benchId);
  if (!bench) notFound();
  const check = await checkSnapshot(store.db, benchId, now);
  return (
    <BenchScreen
      bench={bench}
      check={check}
      me={{ id: person.id, name: person.name, role: person.role }}
      signOut={<SignOut />}
    />
  );
}
