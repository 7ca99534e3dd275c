import type { Metadata } from 'next';

// A plain link: the router's own link would add its script to every page of a visitor.
const FRONT_DOOR = '/';

export const metadata: Metadata = { title: 'Not found' };

/** Said for every address that leads nowhere, without a hint of what might stand elsewhere. */
export default function NotFound() {
  return (
    <main className="max-w-phone mx-auto flex flex-col gap-4 px-4 pt-10 pb-12">
      <h1 className="font-code text-5xl leading-none font-bold">Nothing is here</h1>
      <p>
        The address may be mistyped, or cut short on its way. Scan the code again, or ask at the
        post.
      </p>
      <p>
        <a
          href={FRONT_DOOR}
          className="inline-block py-3 font-semibold underline underline-offset-4"
        >
          To the front door
        </a>
      </p>
    </main>
  );
}
