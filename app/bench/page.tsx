import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { EmptyState } from '@/components/ui/empty-state';
import { TopBar } from '@/components/ui/top-bar';
import { SignOut } from './_components/sign-out';
import { currentStaff } from '@/server/access/current';
import { benchChoices, type BenchChoice } from '@/server/queries/bench/list';
import { getRuntime } from '@/server/runtime';

export const metadata: Metadata = { title: 'Benches' };

const STATE_WORDS = { open: 'open', paused: 'paused', closed: 'closed' };

function benchWords(bench: BenchChoice, staffId: string): string {
  const who =
    bench.operator === null
      ? 'nobody works here'
      : bench.operator.id === staffId
        ? 'you work here'
        : `${bench.operator.name} works here`;
  return [
    STATE_WORDS[bench.state],
    bench.tester ? `tester ${bench.tester}` : 'no tester',
    who,
    bench.tagCode && `${bench.tagCode} is at it`,
  ]
    .filter(Boolean)
    .join(' · ');
}

/** Choose a bench of a meet that is on. */
export default async function BenchesPage() {
  const person = await currentStaff();
  if (!person) redirect('/sign-in?next=/bench');
  const { store, clock } = getRuntime();
  const meets = await benchChoices(store.db, clock());
  return (
    <>
      <TopBar title="Benches" isHeading>
        <span>{person.name}</span>
        <SignOut />
      </TopBar>
      <main className="mx-auto flex max-w-4xl flex-col gap-8 p-6">
        {meets.length === 0 && (
          <EmptyState title="No meet is on today">
            A lead opens a meet at the desk; its benches show here on its days.
          </EmptyState>
        )}
        {meets.map((meet) => (
          <section key={meet.id} aria-labelledby={`meet-${meet.id}`}>
            <h2 id={`meet-${meet.id}`} className="font-code text-3xl font-semibold">
              {meet.name}
            </h2>
            <p className="text-fore-quiet">{meet.place}</p>
            {meet.benches.length === 0 && <p className="mt-3">This meet has no bench yet.</p>}
            <ul className="mt-3 flex flex-col gap-3">
              {meet.benches.map((bench) => (
                <li key={bench.id}>
                  <Link
                    href={`/bench/${bench.id}`}
                    className="border-control flex min-h-20 flex-wrap items-center gap-x-6 rounded-lg border-2 px-5 py-3"
                  >
                    <span className="font-code text-4xl font-semibold">Bench {bench.number}</span>
                    <span className="text-fore-quiet">{benchWords(bench, person.id)}</span>
                  </Link>
                </li>
              ))}
            </ul>
          </section>
        ))}
      </main>
    </>
  );
}
