import { Badge } from '@/components/ui/badge'
import { type Tone } from '@/components/ui/state-mark'

const STATES: Record<string, readonly [Tone, string]> = {
  uploaded: ['amber', 'Columns to choose'],
  checking: ['blueprint', 'Being checked'],
  checked: ['amber', 'Waiting for you to confirm'],
  importing: ['blueprint', 'Being taken in'],
  done: ['verdigris', 'Taken in'],
  failed: ['madder', 'Failed, nothing taken in'],
  cancelled: ['plain', 'Cancelled'],
}

/** Where an import is, as a word and a shape. */
export function ImportStateBadge({ state }: { state: string }) {
  const [tone, words] = STATES[state] ?? (['plain', state] as const)
  return <Badge tone={tone}>{words}</Badge>
}
