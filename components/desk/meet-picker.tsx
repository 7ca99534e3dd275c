import Link from 'next/link';

interface MeetPickerProps {
  /** The page's own path, such as '/desk/records'. */
  path: string;
  meets: { slug: string; name: string; days: string }[];
  chosen: string;
}

/** Chooses the meet that a page of the desk is about: a plain form, so that it works at once. */
export function MeetPicker({ path, meets, chosen }: MeetPickerProps) {
  const [only] = meets;
  if (meets.length === 1 && only) {
    return (
      <Link
        href={`/desk/line/${only.slug}`}
        className="inline-flex min-h-12 items-center underline underline-offset-4"
      >
        {only.name}
      </Link>
    );
  }
  return (
    <form action={path} className="flex items-center gap-2.5">
      <label htmlFor="meet" className="font-semibold">
        Meet
      </label>
      <select
        id="meet"
        name="meet"
        defaultValue={chosen}
        className="border-control min-h-12 rounded-lg border-2 bg-white px-3"
      >
        {meets.map((meet) => (
          <option key={meet.slug} value={meet.slug}>
            {meet.name}, {meet.days}
          </option>
        ))}
      </select>
      <button type="submit" className="border-fore min-h-12 rounded-lg border-2 px-4 font-semibold">
        Show
      </button>
    </form>
  );
}
