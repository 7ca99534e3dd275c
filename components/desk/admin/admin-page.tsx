import Link from 'next/link';
import type { ReactNode } from 'react';
import { QueryProvider } from '@/components/live/query-provider';

interface AdminPageProps {
  title: ReactNode;
  /** One or two plain sentences under the title. */
  intro?: ReactNode;
  /** The list that this page belongs to. */
  back?: { href: string; label: string };
  aside?: ReactNode;
  children: ReactNode;
}

/** A page of the desk where something is set up. */
export function AdminPage({ title, intro, back, aside, children }: AdminPageProps) {
  return (
    <main className="mx-auto flex max-w-[76rem] flex-col gap-7 px-4 py-7 sm:px-6">
      <header className="flex flex-wrap items-end justify-between gap-4">
        <div>
          {back && (
            <Link href={back.href} className="inline-block py-1.5 underline underline-offset-4">
              ← {back.label}
            </Link>
          )}
          <h1 className="font-code text-5xl leading-none font-semibold">{title}</h1>
          {intro && <p className="text-fore-quiet mt-2 max-w-prose">{intro}</p>}
        </div>
        {aside}
      </header>
      <QueryProvider>{children}</QueryProvider>
    </main>
  );
}
