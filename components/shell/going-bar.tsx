'use client'
import { usePathname, useSearchParams } from 'next/navigation'
import { useEffect, useState } from 'react'

const PATIENCE = 250 // [ms] what is quicker than this needs no word

/** The address that a click goes to within this site, or null where it goes elsewhere, or nowhere new. */
function destinationOf(event: MouseEvent): string | null {
  if (event.defaultPrevented || event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey)
    return null
  const link = event.target instanceof Element ? event.target.closest('a') : null
  if (!link || link.target || link.hasAttribute('download') || link.origin !== location.origin) return null
  return link.pathname + link.search === location.pathname + location.search
    ? null
    : link.pathname + link.search
}

/** A thin bar and a word for readers while the next page is on its way: the old page stays until it is there. */
export function GoingBar() {
  const here = `${usePathname()}?${useSearchParams()}`
  const [from, setFrom] = useState<string | null>(null)
  useEffect(() => {
    let wait: ReturnType<typeof setTimeout> | undefined
    // In the capture phase, since a link of the framework prevents the click's own effect.
    const listen = (event: MouseEvent) => {
      if (destinationOf(event) === null) return
      clearTimeout(wait)
      wait = setTimeout(() => setFrom(here), PATIENCE)
    }
    document.addEventListener('click', listen, true)
    return () => {
      clearTimeout(wait)
      document.removeEventListener('click', listen, true)
    }
  }, [here])
  const going = from === here
  return (
    <div role="status" className="no-print fixed inset-x-0 top-0 z-50 h-1 overflow-hidden" hidden={!going}>
      <div className="h-full w-1/3 animate-pulse bg-copper motion-reduce:w-full" />
      <span className="sr-only">{going ? 'The next page is on its way' : ''}</span>
    </div>
  )
}
