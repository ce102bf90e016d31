/** One import in a process of its own, so that its memory is its own: prints its time and its peak. */
import { calendarDay } from '@/lib/calendar/calendar-day'
import { importFromFile } from '@/lib/use-cases/imports/import-from-file'
import { stopDatabase } from '@/lib/use-cases/jobs/stop-database'

const [path = '', organisation = ''] = process.argv.slice(2)
const began = performance.now()
const { report } = await importFromFile({
  path,
  organisation,
  today: calendarDay('2026-12-01'),
  dryRun: false,
})
process.stdout.write(
  JSON.stringify({
    milliseconds: performance.now() - began,
    peakMiB: process.resourceUsage().maxRSS / 1024,
    added: report.homes.added,
  }),
)
await stopDatabase()
