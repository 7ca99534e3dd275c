import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { TestersTable } from '@/components/desk/admin/testers-table';
import { ButtonLink } from '@/components/ui/button-link';
import { EmptyState } from '@/components/ui/empty-state';
import { testerList } from '@/server/queries/testers/list';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../enter';

export const metadata: Metadata = { title: 'Testers' };

export default async function TestersPage() {
  await enterDesk('/desk/testers');
  const { store, clock } = getRuntime();
  const testers = await testerList(store.db, clock());
  const add = <ButtonLink href="/desk/testers/new">New tester</ButtonLink>;
  return (
    <AdminPage
      title="Testers"
      lead="A tester judges when its certificate is valid and it was proved today."
      aside={testers.length > 0 && add}
    >
      {testers.length > 0 ? (
        <TestersTable testers={testers} />
      ) : (
        <EmptyState title="No tester yet" action={add}>
          Enter the first one, then its certificate and a proof.
        </EmptyState>
      )}
    </AdminPage>
  );
}
