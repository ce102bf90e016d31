'use client'
import { Button } from '@/components/ui/button'

/** Prints the page. Without any script there is nothing for it to do, and it is not there. */
export function PrintButton() {
  return (
    <Button kind="secondary" size="compact" className="noscript:hidden" onClick={() => window.print()}>
      Print
    </Button>
  )
}
