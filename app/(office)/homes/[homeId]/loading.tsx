import { Skeleton } from '@/components/ui/skeleton'

export default function Loading() {
  return (
    <div role="status">
      <span className="sr-only">Loading the home…</span>
      <div className="pt-6 pb-4 sm:pt-8">
        <Skeleton className="h-5 w-48 max-w-full" />
        <Skeleton className="mt-2 h-9 w-96 max-w-full" />
        <Skeleton className="mt-3 h-5 w-160 max-w-full" />
        <div className="mt-4 flex gap-2">
          <Skeleton className="h-7 w-36" />
          <Skeleton className="h-7 w-14" />
        </div>
      </div>
      <div className="grid gap-4 lg:grid-cols-[minmax(0,5fr)_minmax(0,4fr)] lg:gap-5">
        <div className="space-y-4 lg:space-y-5">
          <Skeleton className="h-60" />
          <Skeleton className="h-36" />
          <Skeleton className="h-48" />
        </div>
        <Skeleton className="h-[34rem]" />
      </div>
      <Skeleton className="mt-10 h-96" />
    </div>
  )
}
