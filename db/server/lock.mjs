/** One at a time, across processes: a file that names its holder, taken over where the holder has gone. */
import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { nameOf, pause, stillRuns } from './processes.mjs'

const contents = (file) => {
  try {
    return readFileSync(file, 'utf8')
  } catch {
    return null
  }
}

function take(file, mine) {
  try {
    linkSync(mine, file) // a link is made whole or not at all, and never over another
    return true
  } catch (error) {
    if (error.code !== 'EEXIST') throw error
  }
  const holder = contents(file)
  if (holder === null || stillRuns(holder)) return false
  const aside = `${mine}.aside`
  try {
    renameSync(file, aside)
    if (contents(aside) !== holder) linkSync(aside, file) // somebody was quicker: give it back
    rmSync(aside, { force: true })
  } catch (error) {
    if (error.code !== 'ENOENT') throw error
  }
  return false
}

let asked = 0

/** Runs the work while nobody else, in this process or another, holds the same file. */
export async function withLock(file, work) {
  const mine = `${file}.${process.pid}.${(asked += 1)}`
  writeFileSync(mine, nameOf(process.pid))
  try {
    while (!take(file, mine)) await pause(50)
  } finally {
    rmSync(mine, { force: true })
  }
  try {
    return await work()
  } finally {
    rmSync(file, { force: true })
  }
}
