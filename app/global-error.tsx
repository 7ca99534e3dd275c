'use client';

import './globals.css';

/** The last resort, when not even the layout could be made. */
export default function GlobalError({ reset }: { error: Error; reset: () => void }) {
  return (
    <html lang="en-GB">
      <body className="ground-chalk">
        <title>This did not work · Pullpost</title>
        <main className="mx-auto flex max-w-phone flex-col gap-4 px-4 pt-10">
          <h1 className="text-4xl font-bold">This did not work</h1>
          <p>The post did not answer as it should. What was accepted before is safe.</p>
          <p>
            <button
              type="button"
              onClick={reset}
              className="border-fore bg-fore text-ground min-h-12 rounded-lg border-2 px-5 font-semibold"
            >
              Try again
            </button>
          </p>
        </main>
      </body>
    </html>
  );
}
