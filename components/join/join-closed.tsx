interface JoinClosedProps {
  meet: { name: string; slug: string };
  /** The visitor's ticket, when they came from one. */
  ticketPath: string | null;
}

/** Said instead of the form while the line takes no new tools. */
export function JoinClosed({ meet, ticketPath }: JoinClosedProps) {
  return (
    <main className="max-w-phone mx-auto flex flex-col gap-4 px-4 pt-6 pb-12">
      <p className="text-fore-quiet">{meet.name}</p>
      <h1 className="font-code text-5xl leading-none font-bold">
        The line takes no new tools just now
      </h1>
      <p>
        Tools that are already in it are still checked. Ask at the post when it opens again; this
        page will have the form then.
      </p>
      <p className="flex flex-wrap gap-x-6">
        <a
          href={`/m/${meet.slug}/board`}
          className="py-3 font-semibold underline underline-offset-4"
        >
          See the board
        </a>
        {ticketPath && (
          <a href={ticketPath} className="py-3 font-semibold underline underline-offset-4">
            Back to your ticket
          </a>
        )}
      </p>
    </main>
  );
}
