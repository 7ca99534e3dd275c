import type { Metadata } from 'next';
import { DeskPage } from '@/components/desk/desk-page';
import { MeetPicker } from '@/components/desk/meet-picker';
import { Pages } from '@/components/desk/pages';
import { RecordsTable } from '@/components/desk/records/records-table';
import { ButtonLink } from '@/components/ui/button-link';
import { EmptyState } from '@/components/ui/empty-state';
import { meetBySlug } from '@/server/queries/meet/public';
import { recordsOfMeet } from '@/server/queries/records/list';
import { getRuntime } from '@/server/runtime';
import { chooseMeet, enterDesk } from '../enter';

export const metadata: Metadata = { title: 'Records' };

interface RecordsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function Records({ searchParams }: RecordsProps) {
  await enterDesk('/desk/records');
  const { meet: asked, page: pageText } = await searchParams;
  const { meets, meet } = await chooseMeet(asked);
  if (!meet) return <NoMeet />;
  const { store, secret } = getRuntime();
  const asPage = Number(pageText);
  const found = await recordsOfMeet(
    store.db,
    secret,
    meet.id,
    Number.isInteger(asPage) ? asPage : 1,
  );
  const timeZone = (await meetBySlug(store.db, meet.slug))!.timeZone;
  const address = (page: number) => `/desk/records?meet=${meet.slug}&page=${page}`;
  return (
    <DeskPage
      title="Records"
      lead={
        found.pages > 1
          ? `${found.total} signed, page ${found.page} of ${found.pages}`
          : `${found.total} signed`
      }
      aside={<MeetPicker path="/desk/records" meets={meets} chosen={meet.slug} />}
    >
      {found.total === 0 ? (
        <EmptyState title="No record yet">
          <p>A check that is signed off at a bench appears here.</p>
        </EmptyState>
      ) : (
        <RecordsTable rows={found.rows} timeZone={timeZone} />
      )}
      <Pages
        noun="records"
        newer={found.page > 1 ? address(found.page - 1) : null}
        older={found.page < found.pages ? address(found.page + 1) : null}
      />
    </DeskPage>
  );
}

function NoMeet() {
  return (
    <DeskPage title="Records">
      <EmptyState
        title="No meet yet"
        action={<ButtonLink href="/desk/meets">To the meets</ButtonLink>}
      >
        <p>Records belong to a meet. Make the first one.</p>
      </EmptyState>
    </DeskPage>
  );
}
