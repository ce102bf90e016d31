/** File storage on loopback with the real contract (S3), its objects in a folder. */
import { mkdirSync } from 'node:fs'
import S3rver from 's3rver'

const HOST = '127.0.0.1'

/** The one key that this storage accepts. */
export const FILES_KEY = 'S3RVER'

/**
 * Starts the storage with its bucket; port 0 takes any free one.
 * @returns the address, and an end to it
 */
export async function startFiles(given: { port: number; folder: string; bucket: string }) {
  mkdirSync(given.folder, { recursive: true })
  const server = new S3rver({
    address: HOST,
    port: given.port,
    directory: given.folder,
    silent: true,
    resetOnClose: false,
    vhostBuckets: false,
    configureBuckets: [{ name: given.bucket, configs: [] }],
  })
  const { port } = await server.run()
  return { endpoint: `http://${HOST}:${port}`, stop: () => server.close() }
}
