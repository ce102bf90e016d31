import { Skeleton } from '@/components/ui/skeleton'

export default function Loading() {
  return (
    <div role="status">
      <span className="sr-only">Loading…</span>
      <div className="pt-6 pb-4 sm:pt-8">
        <Skeleton className="h-9 w-72 max-w-full" />
        <Skeleton className="mt-3 h-5 w-96 max-w-full" />
      </div>
      <Skeleton className="h-12" />
      <Skeleton className="mt-4 h-96" />
    </div>
  )
}
