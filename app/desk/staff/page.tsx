import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { NewPersonForm } from '@/components/desk/admin/person-forms';
import { StaffTable } from '@/components/desk/admin/staff-table';
import { Panel } from '@/components/ui/panel';
import { staffList } from '@/server/queries/staff/list';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../enter';
import { addPerson } from './actions';

export const metadata: Metadata = { title: 'Staff' };

export default async function StaffPage() {
  await enterDesk('/desk/staff', 'read.staff');
  return (
    <AdminPage title="Staff" lead="Who can sign in, and what each may do.">
      <div className="grid items-start gap-8 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <StaffTable people={await staffList(getRuntime().store.db)} />
        <Panel title="Add a person">
          <NewPersonForm action={addPerson} />
        </Panel>
      </div>
    </AdminPage>
  );
}
