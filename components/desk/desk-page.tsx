import type { ReactNode } from 'react';

interface DeskPageProps {
  title: ReactNode;
  /** One quiet line below the title. */
  lead?: ReactNode;
  /** Links and switches at the right of the title. */
  aside?: ReactNode;
  children: ReactNode;
}

/** The frame of a desk page: its heading, what belongs to all of it, and the rest. */
export function DeskPage({ title, lead, aside, children }: DeskPageProps) {
  return (
    <main className="flex flex-col gap-5 px-4 py-5 sm:px-6">
      <header className="flex flex-wrap items-end justify-between gap-x-8 gap-y-2">
        <div>
          <h1 className="font-code text-4xl leading-none font-semibold">{title}</h1>
          {lead !== undefined && <p className="text-fore-quiet mt-1.5">{lead}</p>}
        </div>
        {aside !== undefined && (
          <div className="flex flex-wrap items-center gap-x-5 gap-y-1">{aside}</div>
        )}
      </header>
      {children}
    </main>
  );
}
