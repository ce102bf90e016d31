import { type ReactNode } from 'react'

/** Text for those who listen, where those who look have it already. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>
}
