import type { ReactNode } from 'react';
import { DeskNav } from '@/components/desk/desk-nav';
import { TopBar } from '@/components/ui/top-bar';
import { currentStaff } from '@/server/access/current';
import { allows } from '@/server/access/policy';
import { meetList } from '@/server/queries/meets/list';
import { getRuntime } from '@/server/runtime';

/** The desk's bar. It grants nothing: each page looks for itself at who is asking. */
export default async function DeskLayout({ children }: { children: ReactNode }) {
  const person = await currentStaff();
  if (!person || !allows('read.desk', person.role)) return children;
  const { store, clock } = getRuntime();
  const [current] = await meetList(store.db, clock());
  return (
    <>
      <TopBar
        title="Desk"
        nav={
          <DeskNav
            lineHref={current ? `/desk/line/${current.slug}` : null}
            isOwner={allows('read.staff', person.role)}
          />
        }
      >
        <span className="text-fore-quiet">{person.name}</span>
        <form method="post" action="/sign-out">
          <button type="submit" className="min-h-12 underline underline-offset-4">
            Sign out
          </button>
        </form>
      </TopBar>
      {children}
    </>
  );
}
