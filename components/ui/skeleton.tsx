import { classNames } from './class-names'

/** The place of something that is on its way, of its size, so that the page never jumps. */
export function Skeleton({ className }: { className?: string }) {
  return <div aria-hidden="true" className={classNames('animate-pulse rounded-plate bg-sunken', className)} />
}
