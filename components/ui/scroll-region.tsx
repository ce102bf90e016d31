'use client'
import { type ReactNode, useEffect, useRef, useState } from 'react'
import { classNames } from './class-names'

/**
 * Holds what may be wider than the screen. Only where it is wider does it scroll and take a tab stop; where it fits,
 * it clips nothing, so that a heading row can stick to the top of the page.
 */
export function ScrollRegion({
  label,
  children,
  className,
}: {
  label: string
  children: ReactNode
  className?: string
}) {
  const region = useRef<HTMLDivElement>(null)
  const [fits, setFits] = useState(false)
  useEffect(() => {
    const box = region.current
    if (!box) return
    const measure = () => setFits(box.scrollWidth <= box.clientWidth + 1)
    const observer = new ResizeObserver(measure)
    observer.observe(box)
    if (box.firstElementChild) observer.observe(box.firstElementChild)
    measure()
    return () => observer.disconnect()
  }, [])
  return (
    <div
      ref={region}
      {...(fits ? {} : { role: 'region', 'aria-label': label, tabIndex: 0 })}
      // relative: words for readers alone are placed absolutely, and would else stretch the page from inside the table
      className={classNames('relative min-w-0', fits ? 'overflow-visible' : 'overflow-x-auto', className)}
    >
      {children}
    </div>
  )
}
