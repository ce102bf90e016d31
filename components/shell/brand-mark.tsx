import { classNames } from '@/components/ui/class-names'

/** Our own mark: a copper wire between two posts, in an open carrier. */
export function BrandMark({ className }: { className?: string }) {
  return (
    <svg
      viewBox="0 0 32 32"
      className={classNames('size-8 shrink-0', className)}
      fill="none"
      aria-hidden="true"
    >
      <path
        d="M2.5 12V8A5.5 5.5 0 0 1 8 2.5H24A5.5 5.5 0 0 1 29.5 8V12M2.5 20V24A5.5 5.5 0 0 0 8 29.5H24A5.5 5.5 0 0 0 29.5 24V20"
        className="stroke-copper"
        strokeWidth="2.5"
        strokeLinecap="round"
      />
      <path
        d="M19 8.5C22 18.5 10 13.5 13 23.5"
        className="stroke-copper"
        strokeWidth="2.8"
        strokeLinecap="round"
      />
      <circle cx="19" cy="8.5" r="3" className="fill-verdigris" />
      <circle cx="13" cy="23.5" r="3" className="fill-verdigris" />
    </svg>
  )
}
