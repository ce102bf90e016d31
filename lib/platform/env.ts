/** Settings, read once and checked. The only reader of process.env. */
import { z } from 'zod'

const loopback = (address: string) => /\/\/([^@/]*@)?(127\.0\.0\.1|localhost|\[::1\])[:/]?/.test(address)

const Settings = z
  .object({
    DATABASE_URL: z.url(),
    DATABASE_URL_MIGRATE: z.url().optional(),
    DATABASE_URL_READ: z.url().optional(),
    DATABASE_POOL: z.coerce.number().int().min(1).max(100).default(10),
    NEXTAUTH_URL: z.url().default('http://localhost:3000'),
    NEXTAUTH_SECRET: z.string().min(32, 'NEXTAUTH_SECRET needs 32 characters or more'),
    MAIL_URL: z.url(),
    /** where a demo's caught mail can be read in the browser; shown to visitors of a demo only */
    MAIL_INBOX_URL: z.url().optional(),
    MAIL_FROM: z.string().default('Fuseward <no-reply@fuseward.example>'),
    FILES_ENDPOINT: z.url(),
    FILES_BUCKET: z.string().default('fuseward'),
    FILES_KEY: z.string().min(1),
    FILES_SECRET: z.string().min(1),
    FUSEWARD_DEPLOYMENT: z.enum(['live', 'demo']).default('live'),
    FUSEWARD_TODAY: z
      .string()
      .regex(/^\d{4}-\d{2}-\d{2}$/)
      .optional(),
    TILE_URL: z.string().optional(),
    TILE_ATTRIBUTION: z.string().optional(),
    LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
  })
  .superRefine((settings, context) => {
    if (settings.FUSEWARD_DEPLOYMENT === 'demo') return
    for (const key of ['MAIL_URL', 'FILES_ENDPOINT'] as const)
      if (loopback(settings[key]))
        context.addIssue({
          code: 'custom',
          path: [key],
          message: `${key} points at a fake on loopback; a live deployment needs the real service`,
        })
    if (settings.FUSEWARD_TODAY)
      context.addIssue({
        code: 'custom',
        path: ['FUSEWARD_TODAY'],
        message: 'FUSEWARD_TODAY pins the date, which only a demo may do',
      })
  })

export type Settings = z.infer<typeof Settings>

let read: Settings | undefined

/**
 * The settings of this process.
 * @throws Error naming every setting that is missing or wrong
 */
export function env(): Settings {
  if (read) return read
  const given = Object.fromEntries(Object.entries(process.env).filter(([, value]) => value !== ''))
  const result = Settings.safeParse(given)
  if (!result.success) throw new Error(`Settings are wrong or missing:\n${z.prettifyError(result.error)}`)
  return (read = result.data)
}
