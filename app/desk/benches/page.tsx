import type { Metadata } from 'next';
import Link from 'next/link';
import { AddBench } from '@/components/desk/admin/add-bench';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { BenchCard } from '@/components/desk/admin/bench-card';
import { MeetPicker } from '@/components/desk/meet-picker';
import { ButtonLink } from '@/components/ui/button-link';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { MAX_BENCHES } from '@/lib/desk/meet';
import { benchList, testerChoices } from '@/server/queries/benches/list';
import { getRuntime } from '@/server/runtime';
import { chooseMeet, enterDesk } from '../enter';

export const metadata: Metadata = { title: 'Benches' };

interface PageInput {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function BenchesPage({ searchParams }: PageInput) {
  await enterDesk('/desk/benches');
  const { store, clock } = getRuntime();
  const { meets, meet } = await chooseMeet((await searchParams).meet);
  if (!meet) {
    return (
      <AdminPage title="Benches">
        <EmptyState
          title="No meet yet"
          action={<ButtonLink href="/desk/meets/new">New meet</ButtonLink>}
        >
          Benches belong to a meet.
        </EmptyState>
      </AdminPage>
    );
  }
  const benches = await benchList(store.db, meet.id, clock());
  const testers = await testerChoices(store.db);
  return (
    <AdminPage
      title="Benches"
      lead={`${meet.name}, ${meet.days}. A tester feeds one bench only.`}
      aside={<MeetPicker path="/desk/benches" meets={meets} chosen={meet.slug} />}
    >
      {testers.length === 0 && (
        <Notice title="No tester yet">
          <Link href="/desk/testers/new" className="underline underline-offset-4">
            Enter a tester
          </Link>
          , then choose it here.
        </Notice>
      )}
      <div className="grid gap-6 lg:grid-cols-2">
        {benches.map((bench) => (
          // A tester that was changed elsewhere is chosen anew.
          <BenchCard key={`${bench.id} ${bench.testerId}`} bench={bench} testers={testers} />
        ))}
      </div>
      {benches.length < MAX_BENCHES && <AddBench meetId={meet.id} />}
    </AdminPage>
  );
}
