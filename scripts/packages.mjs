/** The packages, as package-lock.json has them. */
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { ROOT } from '../db/server/purposes.mjs'

const read = (file) => JSON.parse(readFileSync(join(ROOT, file), 'utf8')).packages

/** Whether node_modules holds what the lock file asks for. npm writes its own list last, so half an install has none. */
export function packagesAreThere() {
  if (!existsSync(join(ROOT, 'node_modules/.package-lock.json'))) return false
  const have = read('node_modules/.package-lock.json')
  return Object.entries(read('package-lock.json')).every(
    ([path, { version, optional, devOptional }]) =>
      !path || optional || devOptional || have[path]?.version === version,
  )
}

/** Installs the packages where they are missing or others than the lock file's. */
export async function ensurePackages(family) {
  if (packagesAreThere()) return 'present'
  const env = { ...process.env, NODE_ENV: '' }
  await family.must('packages', ['npm', 'ci', '--include=dev', '--no-audit', '--no-fund'], env, {
    message: 'The packages could not be installed.',
    advice: 'See that the package registry can be reached, then run this again.',
  })
  return 'installed'
}
