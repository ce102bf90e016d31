'use client'
import { type ReactNode } from 'react'
import { StateMark, type Tone } from './state-mark'

/** Says what has just been done, where it was done, and is read out. Always in the page, empty until there is something. */
export function StatusLine({ children, tone = 'verdigris' }: { children?: ReactNode; tone?: Tone }) {
  const colour = {
    madder: 'text-madder',
    amber: 'text-amber',
    verdigris: 'text-verdigris',
    blueprint: 'text-blueprint',
    plain: 'text-ink',
  }
  return (
    <p role="status" className={`flex min-h-6 items-center gap-2 font-semibold ${colour[tone]}`}>
      {children && <StateMark tone={tone} />}
      <span>{children}</span>
    </p>
  )
}
