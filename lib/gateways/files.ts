/** Keeps files in S3-compatible storage. The database holds name, size and hash; this holds the bytes. */
import { createReadStream, createWriteStream } from 'node:fs'
import { type Readable } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import { DeleteObjectCommand, GetObjectCommand, PutObjectCommand, S3Client } from '@aws-sdk/client-s3'
import { env } from '@/lib/platform/env'

let client: S3Client | undefined

function storage(): S3Client {
  const { FILES_ENDPOINT, FILES_KEY, FILES_SECRET } = env()
  return (client ??= new S3Client({
    endpoint: FILES_ENDPOINT,
    region: 'eu-west-2',
    forcePathStyle: true,
    credentials: { accessKeyId: FILES_KEY, secretAccessKey: FILES_SECRET },
    // some stores keep the checksum's chunk framing inside a streamed object; only send one where it is required
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  }))
}

/** Stores a local file under a key. */
export async function putFile(key: string, path: string, size: number): Promise<void> {
  await storage().send(
    new PutObjectCommand({
      Bucket: env().FILES_BUCKET,
      Key: key,
      Body: createReadStream(path),
      ContentLength: size,
      ContentType: 'application/octet-stream',
    }),
  )
}

/** Fetches a stored file into a local one. */
export async function fetchFile(key: string, path: string): Promise<void> {
  const answer = await storage().send(new GetObjectCommand({ Bucket: env().FILES_BUCKET, Key: key }))
  await pipeline(answer.Body as Readable, createWriteStream(path, { flags: 'wx', mode: 0o600 }))
}

/** Removes a stored file; one that is not there is no error. */
export async function removeFile(key: string): Promise<void> {
  await storage().send(new DeleteObjectCommand({ Bucket: env().FILES_BUCKET, Key: key }))
}
