/** `npm run dev`: the demo, with a site that follows edits. */
import { demandNode } from './node-version.mjs'
import { startStack } from './stack.mjs'
import { step } from './steps.mjs'
import { untilStopped } from './until-stopped.mjs'
import { welcome } from './welcome.mjs'

const since = Date.now()
const { PORT, HOST } = process.env

await untilStopped(
  async (signal) => {
    await step('Node', () => demandNode())
    return startStack({
      purpose: 'demo',
      seed: true,
      web: 'dev',
      port: PORT ? Number(PORT) : undefined,
      host: HOST || '127.0.0.1',
      signal,
      step,
    })
  },
  (stack) => welcome(stack, since),
)
