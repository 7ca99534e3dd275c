'use client';

import clsx from 'clsx';
import Link from 'next/link';
import { usePathname } from 'next/navigation';

interface DeskNavProps {
  /** The line of the current meet; null while there is no meet. */
  lineHref: string | null;
  /** Staff is the owner's. */
  isOwner: boolean;
}

/** The desk's pages, in the order in which a day needs them. */
export function DeskNav({ lineHref, isOwner }: DeskNavProps) {
  const path = usePathname();
  const items = [
    ...(lineHref === null ? [] : [{ href: lineHref, under: '/desk/line', label: 'Line' }]),
    { href: '/desk/records', label: 'Records' },
    { href: '/desk/meets', label: 'Meets' },
    { href: '/desk/benches', label: 'Benches' },
    { href: '/desk/testers', label: 'Testers' },
    { href: '/desk/plans', label: 'Plans' },
    ...(isOwner ? [{ href: '/desk/staff', label: 'Staff' }] : []),
    { href: '/desk/audit', label: 'Audit' },
  ];
  return (
    <ul className="flex flex-wrap">
      {items.map(
        ({ href, label, under = href }: { href: string; label: string; under?: string }) => {
          const isHere = path === under || path.startsWith(`${under}/`);
          return (
            <li key={href}>
              <Link
                href={href}
                aria-current={isHere ? 'page' : undefined}
                className={clsx(
                  'flex min-h-12 items-center px-3',
                  isHere
                    ? 'font-semibold shadow-[inset_0_-4px_0_var(--fore)]'
                    : 'text-fore-quiet hover:text-fore',
                )}
              >
                {label}
              </Link>
            </li>
          );
        },
      )}
    </ul>
  );
}
