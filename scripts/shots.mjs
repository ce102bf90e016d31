/** `npm run shots`: a picture of every page, as every role, wide and narrow, light and dark, into .data/shots. */
import { join, relative } from 'node:path'
import { installIfMissing } from '../db/server/install-if-missing.mjs'
import { KEPT } from '../db/server/purposes.mjs'
import { Trouble } from '../db/server/trouble.mjs'
import { demandNode } from './node-version.mjs'
import { startStack } from './stack.mjs'
import { explain, step } from './steps.mjs'
import { stopSignal } from './stop-signal.mjs'

const INTO = join(KEPT, 'shots')
const signal = stopSignal()

async function takePictures({ family, settings, url }) {
  const words = [
    '--import',
    'tsx',
    'tests/e2e/take-pictures.ts',
    `--url=${url}`,
    `--into=${INTO}`,
    ...process.argv.slice(2),
  ]
  const how = await family.run('pictures', [process.execPath, ...words], settings)
  if (how !== 0) throw new Trouble('Not every picture is as it should be.', { log: family.logOf('pictures') })
  return `in ${relative(process.cwd(), INTO)}`
}

try {
  demandNode()
  await step('Chromium', () => installIfMissing({ debianPackage: 'chromium', programs: ['chromium'] }))
  const stack = await startStack({
    purpose: 'shots',
    today: '2026-12-01',
    seed: true,
    fresh: true,
    signal,
    step,
  })
  await step('pictures', () => takePictures(stack)).finally(() => stack.stop())
} catch (error) {
  explain(error)
  process.exitCode = 1
}
process.exit()
