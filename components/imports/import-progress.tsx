'use client'
import { useQuery } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useEffect } from 'react'
import { Progress } from '@/components/ui/progress'

type Answer = { state: string; done: number; total: number | null }

const LABELS: Record<string, string> = { checking: 'Checking every row', importing: 'Taking the homes in' }

async function ask(importId: string): Promise<Answer> {
  const answer = await fetch(`/api/v1/imports/${importId}/progress`)
  if (!answer.ok) throw new Error(`progress answered ${answer.status}`)
  return (await answer.json()) as Answer
}

/** How far an import has got. When it has got there, the page is read again. It can be left: the work goes on. */
export function ImportProgress({
  importId,
  state,
  start,
}: {
  importId: string
  state: string
  start: Omit<Answer, 'state'> | null
}) {
  const router = useRouter()
  const { data, isError } = useQuery({
    queryKey: ['import-progress', importId, state],
    queryFn: () => ask(importId),
    refetchInterval: 700,
    initialData: { state, done: start?.done ?? 0, total: start?.total ?? null },
  })
  const moved = data.state !== state
  useEffect(() => {
    if (moved) router.refresh()
  }, [moved, router])
  return (
    <div>
      <Progress label={LABELS[state] ?? 'Working'} done={data.done} total={data.total} unit="rows" />
      <p className="mt-3 text-slate">
        {isError
          ? 'The connection is lost for the moment; the work goes on, and this page will catch up.'
          : 'You can leave this page: the work goes on, and the result stays here.'}
      </p>
    </div>
  )
}
