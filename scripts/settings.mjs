/** The settings of a stack's processes, as lib/platform/env.ts reads them. */
import { secrets } from '../db/server/secrets.mjs'

/** What the demo, the browser tests and the pictures run with: fakes on loopback, and a date that may be pinned. */
export function settingsFor({ urls, url, ports, today }) {
  const kept = { ...process.env }
  delete kept.NODE_ENV // Next and tsx each choose their own
  delete kept.FUSEWARD_TODAY
  return {
    ...kept,
    DATABASE_URL: urls.app,
    DATABASE_URL_MIGRATE: urls.migrate,
    DATABASE_URL_READ: urls.read,
    NEXTAUTH_URL: url,
    NEXTAUTH_SECRET: secrets().session,
    MAIL_URL: `smtp://127.0.0.1:${ports.mail}`,
    MAIL_INBOX_URL: `http://127.0.0.1:${ports.inbox}`,
    MAIL_FROM: 'Fuseward <no-reply@fuseward.example>',
    FILES_ENDPOINT: `http://127.0.0.1:${ports.files}`,
    FILES_BUCKET: 'fuseward',
    FILES_KEY: 'S3RVER',
    FILES_SECRET: 'S3RVER',
    FUSEWARD_DEPLOYMENT: 'demo',
    NEXT_TELEMETRY_DISABLED: '1',
    NODE_NO_WARNINGS: '1',
    ...(today && { FUSEWARD_TODAY: today }),
  }
}
