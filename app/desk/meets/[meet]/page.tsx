import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { JoinSwitch } from '@/components/desk/admin/join-switch';
import { MeetForm } from '@/components/desk/admin/meet-form';
import { Panel } from '@/components/ui/panel';
import { timeZoneNames } from '@/lib/desk/time-zones';
import { meetDetails } from '@/server/queries/meets/details';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../../enter';

export const metadata: Metadata = { title: 'Meet' };

export default async function MeetPage({ params }: { params: Promise<{ meet: string }> }) {
  const { meet: meetId } = await params;
  await enterDesk(`/desk/meets/${meetId}`, 'meet.change');
  const meet = await meetDetails(getRuntime().store.db, meetId);
  if (!meet) notFound();
  const { id, slug, joinOpen, plan: _, ...details } = meet;
  const link = 'underline underline-offset-4';
  return (
    <AdminPage title={meet.name} back={{ href: '/desk/meets', label: 'Meets' }}>
      <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <MeetForm meetId={id} details={details} timeZones={timeZoneNames(meet.timeZone)} />
        <div className="flex flex-col gap-6">
          <Panel title="The line">
            <JoinSwitch meetId={id} joinOpen={joinOpen} />
          </Panel>
          <Panel title="Its pages">
            <ul className="flex flex-col gap-2">
              <li>
                <a className={link} href={`/m/${slug}/board`}>
                  Board
                </a>
              </li>
              <li>
                <a className={link} href={`/m/${slug}/join`}>
                  Join
                </a>
              </li>
              <li>
                <a className={link} href={`/desk/benches?meet=${slug}`}>
                  Benches
                </a>
              </li>
              <li>
                <a className={link} href={`/desk/plans?meet=${slug}`}>
                  Check plan
                </a>
              </li>
            </ul>
            <p className="text-fore-quiet mt-3">
              Their address keeps the name that the meet began with, because it is printed on
              posters.
            </p>
          </Panel>
        </div>
      </div>
    </AdminPage>
  );
}
