import clsx from 'clsx';
import type { ComponentProps, ReactNode } from 'react';

/** Folded-away content: native details and summary, so it opens without a script. */
export function Disclosure({
  summary,
  className,
  children,
  ...rest
}: { summary: ReactNode } & Omit<ComponentProps<'details'>, 'summary'>) {
  return (
    <details {...rest} className={clsx('group', className)}>
      <summary className="flex min-h-12 list-none items-center gap-3 py-2 font-semibold [&::-webkit-details-marker]:hidden">
        <svg
          viewBox="0 0 16 16"
          aria-hidden="true"
          className="size-4 shrink-0 transition-[rotate] group-open:rotate-90"
        >
          <path d="m5 2 7 6-7 6" fill="none" stroke="currentColor" strokeWidth="2.4" />
        </svg>
        {summary}
      </summary>
      <div className="flex flex-col gap-4 pt-1 pb-4">{children}</div>
    </details>
  );
}
