import { createHash } from 'node:crypto'
import { createReadStream, createWriteStream } from 'node:fs'
import { join } from 'node:path'
import { Readable, Transform } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import { inTransaction, reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as imports from '@/db/repositories/imports'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid } from '@/lib/errors/expected'
import { putFile } from '@/lib/gateways/files'
import { newId } from '@/lib/platform/new-id'
import { inScratchFolder, withSheets } from './import-file'
import { layoutOfSheet } from './layout-of-sheet'

/** The largest stock list taken [bytes]. */
export const MOST_BYTES = 64 * 1024 * 1024

const refuse = (problem: string) => new Invalid([{ field: 'file', problem }])

/** Lets through no more than the limit, whatever length was announced. */
function limited(most: number): Transform {
  let seen = 0
  return new Transform({
    transform(chunk: Buffer, _encoding, done) {
      seen += chunk.length
      if (seen > most)
        done(refuse(`The file is larger than ${most / 1024 / 1024} MB. Split it, or leave out columns.`))
      else done(null, chunk)
    },
  })
}

async function hashOf(path: string): Promise<{ sha256: string; size: number }> {
  const hash = createHash('sha256')
  let size = 0
  for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
    hash.update(chunk)
    size += chunk.length
  }
  return { sha256: hash.digest('hex'), size }
}

/** A file's name without its path and without characters that have no place in one. */
const tidyName = (name: string) =>
  (name.split(/[\\/]/).at(-1) ?? '').replace(/\p{C}/gu, '').trim().slice(-200) || 'stock list'

/**
 * Takes an upload, looks into it, and keeps it with a guess at how it is to be read.
 * @returns the new import's id
 * @throws Invalid where the file is empty, too large, or of a kind that cannot be read
 */
export async function receiveFile(
  actor: Actor,
  upload: { name: string; content: ReadableStream<Uint8Array> | null },
  today: CalendarDay,
) {
  demand(actor, 'imports.run')
  const { content } = upload
  if (!content) throw refuse('Choose a file to upload.')
  const fileName = tidyName(upload.name)
  return inScratchFolder(async (folder) => {
    const path = join(folder, 'upload')
    await pipeline(
      Readable.fromWeb(content as Parameters<typeof Readable.fromWeb>[0]),
      limited(MOST_BYTES),
      createWriteStream(path),
    )
    const { sha256, size } = await hashOf(path)
    if (size === 0) throw refuse('The file is empty.')
    const layout = await withSheets(path, (sheets) => layoutOfSheet(reading(actor), sheets, today))
    const id = newId()
    const fileKey = `imports/${actor.organisationId}/${id}`
    await putFile(fileKey, path, size)
    await inTransaction(actor, async (scope) => {
      await imports.insert(scope, {
        id,
        fileName,
        fileKey,
        fileSize: size,
        fileSha256: sha256,
        layout,
        startedBy: actor.personId,
      })
      await audit.record(scope, {
        actorId: actor.personId,
        did: 'import.uploaded',
        subjectKind: 'import',
        subjectId: id,
        detail: { sha256, size },
      })
    })
    return { id }
  })
}
