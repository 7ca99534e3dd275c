import Link from 'next/link';
import type { ReactNode } from 'react';
import { DeskPage } from '@/components/desk/desk-page';
import { QueryProvider } from '@/components/live/query-provider';

interface AdminPageProps {
  title: ReactNode;
  /** One or two plain sentences under the title. */
  lead?: ReactNode;
  /** The list that this page belongs to. */
  back?: { href: string; label: string };
  aside?: ReactNode;
  children: ReactNode;
}

/** A page of the desk where something is set up: its forms send commands. */
export function AdminPage({ title, lead, back, aside, children }: AdminPageProps) {
  return (
    <DeskPage
      title={title}
      lead={lead}
      aside={
        (back || aside) && (
          <>
            {back && (
              <Link
                href={back.href}
                className="inline-flex min-h-12 items-center underline underline-offset-4"
              >
                ← {back.label}
              </Link>
            )}
            {aside}
          </>
        )
      }
    >
      <QueryProvider>{children}</QueryProvider>
    </DeskPage>
  );
}
