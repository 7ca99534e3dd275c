import Link from 'next/link';

interface PagesProps {
  /** What is paged, for screen readers: 'records'. */
  noun: string;
  newer: string | null;
  older: string | null;
}

/** Newer and older: the two ways through a long list that starts with the newest. */
export function Pages({ noun, newer, older }: PagesProps) {
  if (newer === null && older === null) return null;
  const look = 'inline-flex min-h-12 items-center font-semibold underline underline-offset-4';
  return (
    <nav aria-label={`Pages of ${noun}`} className="flex gap-6">
      {newer !== null && (
        <Link href={newer} className={look}>
          Newer {noun}
        </Link>
      )}
      {older !== null && (
        <Link href={older} className={look}>
          Older {noun}
        </Link>
      )}
    </nav>
  );
}
