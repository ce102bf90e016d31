'use client'
import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { type KeyboardEvent, useDeferredValue, useEffect, useId, useRef, useState } from 'react'
import { z } from 'zod'
import { classNames } from '@/components/ui/class-names'

const Found = z.object({
  homes: z.array(
    z.object({
      id: z.string(),
      address: z.string(),
      postcode: z.string().nullable(),
      uprn: z.string().nullable(),
      reference: z.string().nullable(),
    }),
  ),
})

async function find(q: string, signal: AbortSignal) {
  const response = await fetch(`/api/v1/homes/search?${new URLSearchParams({ q })}`, { signal })
  if (!response.ok) throw new Error(`The search answered ${response.status}`)
  return Found.parse(await response.json()).homes
}

const typesText = (target: EventTarget | null) =>
  target instanceof HTMLElement &&
  (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))

/** `/` puts the cursor in the search box, wherever nothing is being typed. */
function useSlash(focus: () => void) {
  useEffect(() => {
    const listen = (event: globalThis.KeyboardEvent) => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || typesText(event.target))
        return
      event.preventDefault()
      focus()
    }
    document.addEventListener('keydown', listen)
    return () => document.removeEventListener('keydown', listen)
  }, [focus])
}

/** Finds homes by address, postcode, UPRN or reference. Without any script it is a plain search of the homes list. */
export function HomeSearch({ className }: { className?: string }) {
  const router = useRouter()
  const listId = useId()
  const input = useRef<HTMLInputElement>(null)
  const [text, setText] = useState('')
  const [open, setOpen] = useState(false)
  const [active, setActive] = useState(-1)
  const [focusBox] = useState(() => () => input.current?.focus())
  useSlash(focusBox)
  const asked = useDeferredValue(text.trim())
  const { data = [], isError } = useQuery({
    queryKey: ['home-search', asked],
    queryFn: ({ signal }) => find(asked, signal),
    enabled: asked.length >= 2,
    placeholderData: keepPreviousData,
  })
  const found = asked.length >= 2 ? data : []
  const shown = open && found.length > 0
  const optionId = (at: number) => `${listId}-${at}`
  const go = (id: string) => {
    setOpen(false)
    setText('')
    input.current?.blur()
    router.push(`/homes/${id}`)
  }
  const key = (event: KeyboardEvent) => {
    if (event.key === 'Escape') {
      setOpen(false)
      setActive(-1)
    }
    if (!shown) return
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault()
      const step = event.key === 'ArrowDown' ? 1 : -1
      const places = found.length + 1
      setActive((at) => ((at + 1 + step + places) % places) - 1)
    }
    const home = found[active]
    if (event.key === 'Enter' && home) {
      event.preventDefault()
      go(home.id)
    }
  }
  return (
    <form
      role="search"
      action="/homes"
      className={classNames('relative', className)}
      onSubmit={() => setOpen(false)}
    >
      <label htmlFor={`${listId}-box`} className="sr-only">
        Search homes
      </label>
      <input
        ref={input}
        id={`${listId}-box`}
        type="search"
        name="search"
        role="combobox"
        autoComplete="off"
        spellCheck={false}
        maxLength={120}
        placeholder="Address, postcode or UPRN"
        aria-expanded={shown}
        aria-controls={`${listId}-list`}
        aria-autocomplete="list"
        aria-activedescendant={shown && active >= 0 ? optionId(active) : undefined}
        value={text}
        onChange={(event) => {
          setText(event.target.value)
          setActive(-1)
          setOpen(true)
        }}
        onFocus={() => setOpen(true)}
        onBlur={() => setOpen(false)}
        onKeyDown={key}
        className="h-9 w-full rounded-control border border-edge bg-paper pr-9 pl-3 text-sm text-ink hover:border-ink"
      />
      <kbd
        aria-hidden="true"
        className="pointer-events-none absolute top-1/2 right-2.5 -translate-y-1/2 rounded-plate border border-line px-1.5 font-mono text-xs text-slate"
      >
        /
      </kbd>
      <ul
        id={`${listId}-list`}
        role="listbox"
        aria-label="Homes found"
        className={classNames(
          'absolute inset-x-0 top-full z-40 mt-1.5 max-h-[70dvh] overflow-y-auto rounded-control border border-edge bg-surface p-1',
          !shown && 'hidden',
        )}
      >
        {found.map(({ id, address, postcode, uprn, reference }, at) => (
          <li
            key={id}
            id={optionId(at)}
            role="option"
            aria-selected={at === active}
            onPointerDown={(event) => {
              event.preventDefault()
              go(id)
            }}
            onPointerEnter={() => setActive(at)}
            className={classNames(
              'cursor-pointer rounded-plate px-3 py-1.5',
              at === active && 'bg-copper-wash',
            )}
          >
            <span className="block font-semibold">{address}</span>
            <span className="block text-sm text-slate">
              {postcode} {(uprn ?? reference) && <span className="figures">{uprn ?? reference}</span>}
            </span>
          </li>
        ))}
      </ul>
      <p role="status" className="sr-only">
        {isError
          ? 'The search did not answer.'
          : open && asked.length >= 2
            ? `${found.length} homes found`
            : ''}
      </p>
    </form>
  )
}
