/** Draws public/base-map afresh: `node --import tsx db/seeds/town/write-base-map.ts`. A test fails where it was forgotten. */
import { mkdirSync, writeFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { baseMapFiles } from './base-map-files'

const folder = resolve(import.meta.dirname, '../../../public/base-map')

mkdirSync(folder, { recursive: true })
for (const [name, text] of baseMapFiles()) writeFileSync(resolve(folder, name), text)
