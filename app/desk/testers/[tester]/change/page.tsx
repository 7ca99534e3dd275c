import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { TesterForm } from '@/components/desk/admin/tester-form';
import { testerFormValues } from '@/components/desk/admin/tester-values';
import { loadTester, type TesterParams } from '../../load';

export const metadata: Metadata = { title: 'Change a tester' };

export default async function ChangeTesterPage(input: TesterParams) {
  const tester = await loadTester(input, 'tester.change', '/change');
  return (
    <AdminPage
      title={`Change ${tester.name}`}
      back={{ href: `/desk/testers/${tester.id}`, label: tester.name }}
    >
      <TesterForm testerId={tester.id} defaults={testerFormValues(tester)} />
    </AdminPage>
  );
}
