import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { CertificateForm } from '@/components/desk/admin/certificate-form';
import { loadTester, type TesterParams } from '../../load';

export const metadata: Metadata = { title: 'New certificate' };

export default async function NewCertificatePage(input: TesterParams) {
  const tester = await loadTester(input, 'certificate.add', '/certificate');
  return (
    <AdminPage
      title={`Certificate of ${tester.name}`}
      lead="The newest one holds for checks that begin from now on. Older ones stay."
      back={{ href: `/desk/testers/${tester.id}`, label: tester.name }}
    >
      <CertificateForm testerId={tester.id} />
    </AdminPage>
  );
}
