import Link from 'next/link';

interface MeetChoiceProps {
  /** '/desk/benches' */
  path: string;
  meets: { id: string; name: string; days: string }[];
  chosen: string;
}

/** Which meet a page is about, when there are several. */
export function MeetChoice({ path, meets, chosen }: MeetChoiceProps) {
  if (meets.length < 2) return null;
  return (
    <nav aria-label="Meet" className="flex flex-wrap gap-x-6 gap-y-1">
      {meets.map((meet) => (
        <Link
          key={meet.id}
          href={`${path}?meet=${meet.id}`}
          aria-current={meet.id === chosen ? 'page' : undefined}
          className="min-h-12 py-3 underline-offset-8 aria-[current=page]:font-semibold aria-[current=page]:underline"
        >
          {meet.name} <span className="text-fore-quiet">{meet.days}</span>
        </Link>
      ))}
    </nav>
  );
}
