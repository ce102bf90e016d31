/** `node --import tsx fakes/mail/serve.ts --smtp-port 2525 --web-port 8025 --folder .data/mail` */
import { parseArgs } from 'node:util'
import { startMail } from './start-mail'

const { values } = parseArgs({
  options: {
    'smtp-port': { type: 'string', default: '2525' },
    'web-port': { type: 'string', default: '8025' },
    folder: { type: 'string', default: '.data/mail' },
  },
})
const mail = await startMail({
  smtpPort: Number(values['smtp-port']),
  webPort: Number(values['web-port']),
  folder: values.folder,
})
process.stdout.write(`Mail at ${mail.mailUrl}, to read at ${mail.inbox}\n`)
for (const signal of ['SIGINT', 'SIGTERM'] as const)
  process.on(signal, () => void mail.stop().then(() => process.exit(0)))
