'use client';

/** Stands in for the root layout itself, so it brings its own document and uses nothing of ours. */
export default function GlobalError({ reset }: { error: Error; reset: () => void }) {
  return (
    <html lang="en-GB">
      <body>
        <main>
          <h1>Vaneloft could not be shown</h1>
          <p>
            Something went wrong on our side. Unsaved work on a design is kept in this browser.
          </p>
          <button type="button" onClick={reset}>
            Try again
          </button>
        </main>
      </body>
    </html>
  );
}
