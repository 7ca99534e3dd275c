import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { PasswordForm, PersonForm } from '@/components/desk/admin/person-forms';
import { Panel } from '@/components/ui/panel';
import { staffMember } from '@/server/queries/staff/list';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../../enter';
import { changePassword } from '../actions';

export const metadata: Metadata = { title: 'Person' };

export default async function PersonPage({ params }: { params: Promise<{ person: string }> }) {
  const { person: staffId } = await params;
  await enterDesk(`/desk/staff/${staffId}`, 'read.staff');
  const person = await staffMember(getRuntime().store.db, staffId);
  if (!person) notFound();
  return (
    <AdminPage
      title={person.name}
      lead={`Signs in as ${person.login}.`}
      back={{ href: '/desk/staff', label: 'Staff' }}
    >
      <div className="grid items-start gap-8 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <PersonForm person={person} />
        <Panel title="Password">
          <PasswordForm staffId={person.id} action={changePassword} />
        </Panel>
      </div>
    </AdminPage>
  );
}
