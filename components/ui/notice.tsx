import clsx from 'clsx';
import type { ReactNode } from 'react';
import { WarningShape } from './warning-shape';

interface NoticeProps {
  /** `problem` is announced at once (role alert); `info` waits its turn (role status). */
  kind?: 'info' | 'problem';
  title?: ReactNode;
  children?: ReactNode;
  className?: string;
}

/** A message on the page. Never in a verdict's colour: ink, a bar and a shape say how grave. */
export function Notice({ kind = 'info', title, children, className }: NoticeProps) {
  const isProblem = kind === 'problem';
  return (
    <div
      role={isProblem ? 'alert' : 'status'}
      className={clsx(
        'bg-band text-ink flex gap-3 border-l-6 px-4 py-3',
        isProblem ? 'border-ink outline-ink outline-2 -outline-offset-2' : 'border-guard-line',
        className,
      )}
    >
      {isProblem && <WarningShape className="mt-0.5 size-6 shrink-0" />}
      <div className="min-w-0 flex-1">
        {title !== undefined && <p className="font-bold">{title}</p>}
        {children}
      </div>
    </div>
  );
}
