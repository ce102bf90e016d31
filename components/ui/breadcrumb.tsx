import Link from 'next/link'

/** Where a page lies, below the second level. The last step is the page itself and is no link. */
export function Breadcrumb({
  steps,
  here,
}: {
  steps: readonly { href: string; label: string }[]
  here: string
}) {
  return (
    <nav aria-label="Breadcrumb" className="no-print text-sm">
      <ol className="flex flex-wrap items-center gap-x-2">
        {steps.map(({ href, label }) => (
          <li key={href} className="flex items-center gap-2">
            <Link href={href} className="link-block link">
              {label}
            </Link>
            <span aria-hidden="true" className="text-slate">
              /
            </span>
          </li>
        ))}
        <li aria-current="page" className="text-slate">
          {here}
        </li>
      </ol>
    </nav>
  )
}
