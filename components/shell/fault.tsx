'use client'
import { useEffect, useRef } from 'react'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'

/** A fault of ours: says that it is one, that nothing was lost by the person, and what to quote. */
export function Fault({ digest, onRetry }: { digest?: string; onRetry: () => void }) {
  const heading = useRef<HTMLHeadingElement>(null)
  useEffect(() => heading.current?.focus(), [])
  return (
    <div role="alert" className="max-w-reading py-12">
      <h1 ref={heading} tabIndex={-1} className="text-3xl">
        Something went wrong on our side
      </h1>
      <p className="mt-3">
        This page could not be shown. What is in the register is as it was. Try again in a moment.
      </p>
      {digest && (
        <p className="mt-2 text-slate">
          If it happens again, quote <span className="figures text-ink">{digest}</span>.
        </p>
      )}
      <div className="mt-6 flex flex-wrap gap-3">
        <Button onClick={onRetry}>Try again</Button>
        <ButtonLink href="/today" kind="secondary">
          Go to Today
        </ButtonLink>
      </div>
    </div>
  )
}
