'use client'

/** The last resort, where even the layout failed: plain words without any of the site's styles or scripts. */
export default function GlobalError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return (
    <html lang="en-GB">
      <head>
        <title>Something went wrong · Fuseward</title>
      </head>
      <body>
        <main>
          <h1>Something went wrong on our side</h1>
          <p>Nothing was changed in the register. Try again in a moment.</p>
          {error.digest && <p>If it happens again, quote {error.digest}.</p>}
          <button type="button" onClick={reset}>
            Try again
          </button>
        </main>
      </body>
    </html>
  )
}
