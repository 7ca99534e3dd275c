import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: ReactNode;
  children?: ReactNode;
  /** What can be done about it, such as a button. */
  action?: ReactNode;
}

/** Says that there is nothing here yet, and what would change that. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="border-control flex flex-col items-start gap-2 rounded-lg border-2 border-dashed p-6">
      <p className="font-code text-2xl font-semibold">{title}</p>
      {children !== undefined && <div className="text-fore-quiet max-w-prose">{children}</div>}
      {action !== undefined && <div className="mt-2">{action}</div>}
    </div>
  );
}
