/** `npm run audit:verify`: walks the hash chain of every organisation, and exits 1 at a break. */
import { stopDatabase } from '@/lib/use-cases/jobs/stop-database'
import { verifyAuditTrails } from '@/lib/use-cases/audit/verify-audit-trails'

const verdicts = await verifyAuditTrails()
const breaks = verdicts.filter((verdict) => verdict.broken)
for (const { organisationId, entries, broken } of verdicts)
  console.log(
    broken
      ? `${organisationId}: BROKEN at entry ${broken.sequence}: ${broken.why} (${entries} right before it)`
      : `${organisationId}: ${entries} entries, unbroken`,
  )
await stopDatabase()
process.exit(breaks.length > 0 ? 1 : 0)
