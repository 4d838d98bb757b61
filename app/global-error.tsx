'use client';

import './globals.css';

/** Stands in for the whole document where even the layout fails. */
export default function GlobalError({ reset }: { error: Error; reset: () => void }) {
  return (
    <html lang="en">
      <body>
        <main className="mx-auto max-w-md p-6">
          <h1 className="text-lg font-semibold">Plumbrow failed to open</h1>
          <p className="my-3">
            Nothing was changed. Try again; if it goes on, tell whoever runs this server.
          </p>
          <button
            type="button"
            onClick={reset}
            className="rounded border border-cord px-3 py-1 font-semibold text-cord"
          >
            Try again
          </button>
        </main>
      </body>
    </html>
  );
}
