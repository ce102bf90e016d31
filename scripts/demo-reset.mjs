/** `npm run demo:reset`: throws the demo's data, letters and files away and makes them anew. Refuses while it runs. */
import { demandNode } from './node-version.mjs'
import { startStack } from './stack.mjs'
import { explain, step } from './steps.mjs'

try {
  demandNode()
  const stack = await startStack({ purpose: 'demo', fresh: true, seed: true, web: 'none', step })
  await stack.stop()
  process.stdout.write('\nThe demo is as new. Start it with npm start.\n')
} catch (error) {
  explain(error)
  process.exitCode = 1
}
process.exit()
