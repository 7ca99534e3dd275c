import type { Metadata } from 'next';
import { DeskPage } from '@/components/desk/desk-page';
import { Pages } from '@/components/desk/pages';
import { EmptyState } from '@/components/ui/empty-state';
import { parseTagCode } from '@/lib/line/code';
import { meetBySlug } from '@/server/queries/meet/public';
import { ledgerPage } from '@/server/queries/ledger/page';
import { getRuntime } from '@/server/runtime';
import { chooseMeet, enterDesk } from '../enter';
import { AuditFilter, WHOLE_POST } from './_components/audit-filter';
import { AuditTable } from './_components/audit-table';

export const metadata: Metadata = { title: 'Audit' };

interface AuditProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const textOf = (value: string | string[] | undefined): string =>
  typeof value === 'string' ? value.trim() : '';

export default async function Audit({ searchParams }: AuditProps) {
  await enterDesk('/desk/audit');
  const asked = await searchParams;
  const { meets, meet } = await chooseMeet(asked.meet);
  const isWholePost = asked.meet === WHOLE_POST || meet === null;
  const typed = isWholePost ? '' : textOf(asked.tag);
  const tagCode = typed === '' ? null : parseTagCode(typed);
  const before = /^\d{1,15}$/.test(textOf(asked.before)) ? Number(textOf(asked.before)) : null;
  const isBadCode = typed !== '' && tagCode === null;
  const { store } = getRuntime();
  const meetId = isWholePost ? null : meet.id;
  const found = isBadCode
    ? { rows: [], older: null, isNewest: true }
    : await ledgerPage(store.db, { meetId, tagCode, before });
  const timeZone = meet ? (await meetBySlug(store.db, meet.slug))!.timeZone : 'UTC';
  const chosen = isWholePost ? WHOLE_POST : meet.slug;
  const base = `/desk/audit?meet=${chosen}${tagCode ? `&tag=${tagCode}` : ''}`;
  return (
    <DeskPage title="Audit" lead="Who did what, the newest first. Nothing here can be changed.">
      <AuditFilter
        meets={meets}
        chosen={chosen}
        tag={typed}
        error={isBadCode ? 'A code is a letter and two digits, such as A27.' : undefined}
      />
      {found.rows.length === 0 ? (
        <EmptyState title="No entry">
          <p>{tagCode ? `Nothing was done with ${tagCode} here.` : 'Nothing was done here yet.'}</p>
        </EmptyState>
      ) : (
        <AuditTable rows={found.rows} timeZone={timeZone} />
      )}
      <Pages
        noun="entries"
        newer={found.isNewest ? null : base}
        older={found.older === null ? null : `${base}&before=${found.older}`}
      />
    </DeskPage>
  );
}
