import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { MeetsTable } from '@/components/desk/admin/meets-table';
import { ButtonLink } from '@/components/ui/button-link';
import { meetList } from '@/server/queries/meets/list';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../enter';

export const metadata: Metadata = { title: 'Meets' };

export default async function MeetsPage() {
  await enterDesk('/desk/meets');
  const { store, clock } = getRuntime();
  return (
    <AdminPage title="Meets" aside={<ButtonLink href="/desk/meets/new">New meet</ButtonLink>}>
      <MeetsTable meets={await meetList(store.db, clock())} />
    </AdminPage>
  );
}
