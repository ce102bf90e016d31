/** The build of the site, made anew only where its sources have changed. */
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { ROOT } from '../db/server/purposes.mjs'
import { Trouble } from '../db/server/trouble.mjs'
import { running } from './family.mjs'

const FOLDERS = ['app', 'components', 'db', 'fakes', 'jobs', 'lib', 'public']
const STAMP = join(ROOT, '.next', 'fuseward-build-stamp')

export const NEXT = join(ROOT, 'node_modules', 'next', 'dist', 'bin', 'next')

const filesUnder = (folder) =>
  readdirSync(join(ROOT, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath ?? entry.path, entry.name).slice(ROOT.length + 1))

/** A digest of everything that a build is made of: by content, since a clone or a checkout changes every date. */
function sources() {
  const atRoot = readdirSync(ROOT).filter(
    (name) => /\.(ts|mjs)$|^package-lock\.json$|^tsconfig\.json$/.test(name) && name !== 'next-env.d.ts',
  )
  const hash = createHash('sha256')
  for (const file of [
    ...atRoot,
    ...FOLDERS.filter((folder) => existsSync(join(ROOT, folder))).flatMap(filesUnder),
  ].sort())
    hash
      .update(file)
      .update('\0')
      .update(readFileSync(join(ROOT, file)))
      .update('\0')
  return hash.digest('hex')
}

const isFresh = (digest) =>
  existsSync(join(ROOT, '.next', 'BUILD_ID')) && existsSync(STAMP) && readFileSync(STAMP, 'utf8') === digest

/**
 * Builds where the build is stale.
 * @throws Trouble where it fails, or where another launcher serves the build that would be replaced
 */
export async function ensureBuild(family, { always = false } = {}) {
  const digest = sources()
  if (!always && isFresh(digest)) return 'fresh'
  const other = ['demo', 'e2e', 'shots'].find(
    (purpose) => purpose !== family.purpose && running(purpose)?.url,
  )
  if (other)
    throw new Trouble(`Fuseward (${other}) is running on the build that has to be replaced.`, {
      advice: 'Stop it (Ctrl-C where it runs), then run this again.',
    })
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' }
  await family.must('build', [process.execPath, NEXT, 'build'], env, {
    message: 'The build failed.',
    advice: 'Put right what it names, then run this again.',
  })
  writeFileSync(STAMP, digest)
  return 'made'
}
