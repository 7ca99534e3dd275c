import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { BasisExplained } from '@/components/desk/admin/basis-explained';
import { PlanForm } from '@/components/desk/admin/plan-form';
import { MeetPicker } from '@/components/desk/meet-picker';
import { ButtonLink } from '@/components/ui/button-link';
import { EmptyState } from '@/components/ui/empty-state';
import { Panel } from '@/components/ui/panel';
import { meetDetails } from '@/server/queries/meets/details';
import { getRuntime } from '@/server/runtime';
import { chooseMeet, enterDesk } from '../enter';

export const metadata: Metadata = { title: 'Check plan' };

interface PageInput {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function PlansPage({ searchParams }: PageInput) {
  await enterDesk('/desk/plans', 'plan.change');
  const { meets, meet } = await chooseMeet((await searchParams).meet);
  const details = meet && (await meetDetails(getRuntime().store.db, meet.id));
  if (!details) {
    return (
      <AdminPage title="Check plan">
        <EmptyState
          title="No meet yet"
          action={<ButtonLink href="/desk/meets/new">New meet</ButtonLink>}
        >
          A plan belongs to a meet.
        </EmptyState>
      </AdminPage>
    );
  }
  return (
    <AdminPage
      title="Check plan"
      lead={`${details.name} · version ${details.plan.version}. A check that has begun keeps its plan.`}
      aside={<MeetPicker path="/desk/plans" meets={meets} chosen={details.slug} />}
    >
      <div className="grid items-start gap-8 lg:grid-cols-[minmax(0,1fr)_26rem]">
        <PlanForm key={details.id} meetId={details.id} plan={details.plan} />
        <Panel title="How the basis matters">
          <BasisExplained />
        </Panel>
      </div>
    </AdminPage>
  );
}
