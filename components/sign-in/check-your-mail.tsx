'use client'
import { type ReactNode, useEffect, useRef } from 'react'

type Props = { email: string; inbox: string | null; children: ReactNode }

/** What comes after a form that sends a letter. It says the same whether the address is known or not. */
export function CheckYourMail({ email, inbox, children }: Props) {
  const heading = useRef<HTMLHeadingElement>(null)
  useEffect(() => heading.current?.focus(), [])
  return (
    <div className="pt-6 sm:pt-8">
      <h1 ref={heading} tabIndex={-1} className="text-2xl sm:text-3xl">
        Look at your e-mail
      </h1>
      <p className="mt-4 max-w-reading">
        A letter is on its way to <strong className="break-words">{email}</strong>. {children}
      </p>
      <p className="mt-3 max-w-reading text-slate">
        Nothing there after some minutes? Look among unwanted mail, and check the address.
      </p>
      {inbox && (
        <p className="mt-5 border-l-4 border-blueprint bg-surface px-4 py-3">
          This is a demonstration: its letters go to nobody.{' '}
          <a href={inbox} target="_blank" rel="noreferrer" className="link">
            Read them here (opens a new tab)
          </a>
        </p>
      )}
    </div>
  )
}
