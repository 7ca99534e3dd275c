import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { connection } from 'next/server';
import { serviceDay } from '@/lib/time/service-day';
import { timeZoneNames } from '@/lib/desk/time-zones';
import { isSetUp } from '@/server/queries/staff/any';
import { getRuntime } from '@/server/runtime';
import { SetUpForm } from './_components/set-up-form';

export const metadata: Metadata = { title: 'Set up' };

/** The first visit to an empty post; there is no such page once it has an owner. */
export default async function SetUpPage() {
  await connection();
  const { store, setupCode, clock } = getRuntime();
  if (setupCode === null || (await isSetUp(store.db))) notFound();
  const timeZone = Intl.DateTimeFormat().resolvedOptions().timeZone;
  return (
    <main className="mx-auto max-w-prose px-5 py-10">
      <h1 className="font-code text-5xl font-semibold">Set up this post</h1>
      <p className="text-fore-quiet mt-2 mb-8">
        This is done once. It makes the post, your own account as its owner, and the first meet.
      </p>
      <SetUpForm
        today={serviceDay(clock(), timeZone, 0)}
        timeZone={timeZone}
        timeZones={timeZoneNames(timeZone)}
      />
    </main>
  );
}
