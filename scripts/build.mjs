/** `npm run build`: builds the site, whether or not its sources have changed. */
import { ensureBuild } from './build-site.mjs'
import { claim } from './family.mjs'
import { ensurePackages } from './packages.mjs'
import { explain, step } from './steps.mjs'

try {
  const family = await claim('build')
  try {
    await step('packages', () => ensurePackages(family))
    await step('build', () => ensureBuild(family, { always: true }))
  } finally {
    await family.stop()
  }
} catch (error) {
  explain(error)
  process.exitCode = 1
}
