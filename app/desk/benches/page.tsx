import type { Metadata } from 'next';
import { AddBench } from '@/components/desk/admin/add-bench';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { BenchCard } from '@/components/desk/admin/bench-card';
import { MeetChoice } from '@/components/desk/admin/meet-choice';
import { ButtonLink } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { MAX_BENCHES } from '@/lib/desk/meet';
import { staffForPage } from '@/server/access/for-page';
import { benchList, testerChoices } from '@/server/queries/benches/list';
import { chosenMeet } from '@/server/queries/meets/chosen';
import { getRuntime } from '@/server/runtime';

export const metadata: Metadata = { title: 'Benches' };

interface PageInput {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function BenchesPage({ searchParams }: PageInput) {
  await staffForPage('read.desk', '/desk/benches');
  const { store, clock } = getRuntime();
  const { meets, chosen } = await chosenMeet(store.db, clock(), (await searchParams).meet);
  if (!chosen) {
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
  const benches = await benchList(store.db, chosen.id, clock());
  const testers = await testerChoices(store.db);
  return (
    <AdminPage
      title="Benches"
      intro={`${chosen.name}, ${chosen.days}. A tester feeds one bench only.`}
      aside={benches.length < MAX_BENCHES && <AddBench meetId={chosen.id} />}
    >
      <MeetChoice path="/desk/benches" meets={meets} chosen={chosen.id} />
      <div className="grid gap-6 lg:grid-cols-2">
        {benches.map((bench) => (
          // A tester that was changed elsewhere is chosen anew.
          <BenchCard key={`${bench.id} ${bench.testerId}`} bench={bench} testers={testers} />
        ))}
      </div>
    </AdminPage>
  );
}
