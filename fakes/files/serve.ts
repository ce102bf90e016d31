/** `node --import tsx fakes/files/serve.ts --port 4568 --folder .data/files --bucket fuseward` */
import { parseArgs } from 'node:util'
import { startFiles } from './start-files'

const { values } = parseArgs({
  options: {
    port: { type: 'string', default: '4568' },
    folder: { type: 'string', default: '.data/files' },
    bucket: { type: 'string', default: 'fuseward' },
  },
})
const files = await startFiles({ port: Number(values.port), folder: values.folder, bucket: values.bucket })
process.stdout.write(`Files at ${files.endpoint}\n`)
for (const signal of ['SIGINT', 'SIGTERM'] as const)
  process.on(signal, () => void files.stop().then(() => process.exit(0)))
