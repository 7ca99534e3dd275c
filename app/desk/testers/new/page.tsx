import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { TesterForm } from '@/components/desk/admin/tester-form';
import { NEW_TESTER } from '@/components/desk/admin/tester-values';
import { enterDesk } from '../../enter';

export const metadata: Metadata = { title: 'New tester' };

export default async function NewTesterPage() {
  await enterDesk('/desk/testers/new', 'tester.add');
  return (
    <AdminPage title="New tester" back={{ href: '/desk/testers', label: 'Testers' }}>
      <TesterForm testerId={null} defaults={NEW_TESTER} />
    </AdminPage>
  );
}
