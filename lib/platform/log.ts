/** Structured logs. No personal data: addresses, names, e-mail and free text never go in. */
import pino, { type Logger } from 'pino'
import { env } from './env'

let made: Logger | undefined

/** The logger of this process, one JSON line an event. */
export function log(): Logger {
  return (made ??= pino({
    level: env().LOG_LEVEL,
    base: undefined,
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: {
      paths: [
        'email',
        'name',
        'address',
        'password',
        'token',
        'cookie',
        '*.email',
        '*.password',
        '*.token',
        '*.cookie',
      ],
      censor: '[withheld]',
    },
  }))
}
