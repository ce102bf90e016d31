'use client'
import { Fault } from '@/components/shell/fault'

export default function OfficeError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return <Fault digest={error.digest} onRetry={reset} />
}
