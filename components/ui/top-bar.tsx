import clsx from 'clsx';
import type { ReactNode } from 'react';

interface TopBarProps {
  /** Where we are: 'Bench 1', 'Desk'. */
  title: ReactNode;
  /** The page's h1 when true; else plain words. */
  isHeading?: boolean;
  /** A quiet fact beside it, such as the tester and its proof. */
  detail?: ReactNode;
  /** Links or tabs in the middle. */
  nav?: ReactNode;
  /** Right side: counts, connection, who is signed in. */
  children?: ReactNode;
  className?: string;
}

/** The staff's top bar, in the wall's colour. */
export function TopBar({
  title,
  isHeading = false,
  detail,
  nav,
  children,
  className,
}: TopBarProps) {
  const Title = isHeading ? 'h1' : 'p';
  return (
    <header
      className={clsx(
        'ground-wall flex min-h-16 flex-wrap items-center gap-x-6 gap-y-1 px-4 py-2 sm:px-6',
        className,
      )}
    >
      <Title className="font-code text-3xl font-semibold">{title}</Title>
      {detail !== undefined && <div className="text-fore-quiet">{detail}</div>}
      {nav !== undefined && <nav aria-label="Main">{nav}</nav>}
      {children !== undefined && (
        <div className="ml-auto flex flex-wrap items-center gap-x-6 gap-y-1">{children}</div>
      )}
    </header>
  );
}
