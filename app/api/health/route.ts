import { answer } from '@/app/api/read'
import { logFault } from '@/lib/platform/log-fault'
import { checkHealth } from '@/lib/use-cases/health/check-health'

export const dynamic = 'force-dynamic'

/** For the load balancer: 200 where this process and the database answer, 503 otherwise. Says nothing else. */
export async function GET(): Promise<Response> {
  try {
    await checkHealth()
    return answer({ ok: true })
  } catch (thrown) {
    logFault(thrown, 'health')
    return answer({ ok: false }, 503)
  }
}
