import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { CertificateList } from '@/components/desk/admin/certificate-list';
import { LockForm } from '@/components/desk/admin/lock-form';
import { ProofForm } from '@/components/desk/admin/proof-form';
import { ProofList } from '@/components/desk/admin/proof-list';
import { TesterFacts } from '@/components/desk/admin/tester-facts';
import { ButtonLink } from '@/components/ui/button-link';
import { Disclosure } from '@/components/ui/disclosure';
import { Notice } from '@/components/ui/notice';
import { Panel } from '@/components/ui/panel';
import { loadTester, type TesterParams } from '../load';

export const metadata: Metadata = { title: 'Tester' };

export default async function TesterPage(input: TesterParams) {
  const tester = await loadTester(input, 'read.desk');
  const here = `/desk/testers/${tester.id}`;
  return (
    <AdminPage
      title={tester.name}
      lead={`${tester.maker} ${tester.model}, ${tester.serial} · stands on ${tester.bench ?? 'no bench'}`}
      back={{ href: '/desk/testers', label: 'Testers' }}
      aside={
        <ButtonLink variant="secondary" href={`${here}/change`}>
          Change
        </ButtonLink>
      }
    >
      {tester.lockedReason !== null && (
        <Notice kind="problem" title="Locked">
          {tester.lockedReason} A proof that passes, or a certificate issued since, lifts the lock.
        </Notice>
      )}
      {tester.barred.length > 0 ? (
        <Notice title="It judges nothing now">
          Because {tester.barred.join(', and because ')}.
        </Notice>
      ) : (
        <Notice>It may judge today.</Notice>
      )}
      <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_26rem]">
        <div className="flex min-w-0 flex-col gap-6">
          <Panel title="Proofs">
            <ProofList proofs={tester.proofs} more={tester.moreProofs} />
          </Panel>
          <Panel
            title="Certificates"
            aside={
              <ButtonLink variant="secondary" href={`${here}/certificate`}>
                Enter a certificate
              </ButtonLink>
            }
          >
            <CertificateList certificates={tester.certificates} />
          </Panel>
        </div>
        <div className="flex flex-col gap-6">
          <Panel title="Enter a proof">
            <ProofForm testerId={tester.id} locked={tester.lockedReason !== null} />
          </Panel>
          <Panel title="Facts">
            <TesterFacts tester={tester} />
          </Panel>
          <Panel>
            <Disclosure summary="Lock this tester">
              <p>
                No check on it is judged until a proof passes, or a certificate is entered that was
                issued since.
              </p>
              <LockForm testerId={tester.id} />
            </Disclosure>
          </Panel>
        </div>
      </div>
    </AdminPage>
  );
}
