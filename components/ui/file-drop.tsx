'use client'
import { type ReactNode, useState } from 'react'
import { classNames } from './class-names'
import { Field } from './field'
import { useFieldState } from './form-context'

type Props = {
  name: string
  label: ReactNode
  hint?: ReactNode
  /** what the picker offers: ".csv,.xlsx" */
  accept?: string
  problem?: string
  required?: boolean
  onPick?: (file: File | null) => void
}

const sizeInWords = (bytes: number) =>
  bytes < 1_000_000 ? `${Math.max(1, Math.round(bytes / 1000))} kB` : `${(bytes / 1_000_000).toFixed(1)} MB`

/** A file to hand in: the browser's own control, large enough to drop a file on. */
export function FileDrop({ name, label, hint, accept, problem, required, onPick }: Props) {
  const state = useFieldState(name, hint !== undefined, problem)
  const [file, setFile] = useState<{ name: string; size: number } | null>(null)
  const [over, setOver] = useState(false)
  return (
    <Field state={state} label={label} hint={hint}>
      <div
        className={classNames(
          'relative flex min-h-36 flex-col items-center justify-center gap-2 rounded-control border-2 border-dashed p-4 text-center',
          'focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-copper',
          over
            ? 'border-copper bg-copper-wash'
            : state.problem
              ? 'border-madder bg-surface'
              : 'border-edge bg-surface hover:border-copper',
        )}
      >
        {/* Invisible and as large as the box, so that a file dropped anywhere on it lands in the control itself. */}
        <input
          type="file"
          id={state.id}
          name={name}
          accept={accept}
          required={required}
          aria-describedby={state.describedBy}
          aria-invalid={state.problem ? true : undefined}
          className="absolute inset-0 size-full cursor-pointer opacity-0"
          onDragEnter={() => setOver(true)}
          onDragLeave={() => setOver(false)}
          onDrop={() => setOver(false)}
          onChange={(event) => {
            const picked = event.currentTarget.files?.[0] ?? null
            setFile(picked && { name: picked.name, size: picked.size })
            onPick?.(picked)
          }}
        />
        <svg
          viewBox="0 0 24 24"
          className="size-7 text-copper"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.8"
          aria-hidden="true"
        >
          <path d="M12 15V4m-4.5 4L12 3.5 16.5 8M4 14v6h16v-6" strokeLinecap="round" strokeLinejoin="round" />
        </svg>
        <p role="status">
          {file ? (
            <>
              <span className="font-semibold">{file.name}</span>
              <span className="text-slate">, {sizeInWords(file.size)}</span>
            </>
          ) : (
            <>
              <span className="font-semibold text-copper underline underline-offset-4">Choose a file</span> or
              drop it here
            </>
          )}
        </p>
      </div>
    </Field>
  )
}
