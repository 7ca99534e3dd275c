'use client';

/** Said when a page could not be made, or the post did not answer. */
export default function ErrorPage({ reset }: { error: Error; reset: () => void }) {
  return (
    <main className="max-w-phone mx-auto flex flex-col gap-4 px-4 pt-10 pb-12">
      <h1 className="font-code text-5xl leading-none font-bold">This did not work</h1>
      <p>
        The post did not answer as it should. What was accepted before is safe. Try again; if it
        happens again, tell the staff.
      </p>
      <p className="flex flex-wrap items-center gap-x-6">
        <button
          type="button"
          onClick={reset}
          className="border-fore bg-fore text-ground min-h-12 rounded-lg border-2 px-5 font-semibold"
        >
          Try again
        </button>
        {/* A whole new page on purpose: what is loaded here has failed. */}
        <a href="" className="inline-block py-3 font-semibold underline underline-offset-4">
          Reload the page
        </a>
      </p>
    </main>
  );
}
