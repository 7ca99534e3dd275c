import type { Metadata } from 'next';
import { AdminPage } from '@/components/desk/admin/admin-page';
import { NewMeetForm } from '@/components/desk/admin/meet-form';
import { timeZoneNames } from '@/lib/desk/time-zones';
import { serviceDay } from '@/lib/time/service-day';
import { currentMeet } from '@/server/queries/meets/list';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../../enter';

export const metadata: Metadata = { title: 'New meet' };

export default async function NewMeetPage() {
  await enterDesk('/desk/meets/new', 'meet.create');
  const { store, clock } = getRuntime();
  const last = await currentMeet(store.db, clock());
  const timeZone = last?.timeZone ?? Intl.DateTimeFormat().resolvedOptions().timeZone;
  const today = serviceDay(clock(), timeZone, 0);
  return (
    <AdminPage title="New meet" back={{ href: '/desk/meets', label: 'Meets' }}>
      <NewMeetForm
        timeZones={timeZoneNames(timeZone)}
        defaults={{
          name: '',
          place: '',
          startsOn: today,
          endsOn: today,
          timeZone,
          dayStartHour: last?.dayStartHour ?? 4,
          latitudeDeg: '',
          heightM: '',
          benches: 2,
        }}
      />
    </AdminPage>
  );
}
