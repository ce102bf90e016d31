/** Ports on loopback. */
import { createServer } from 'node:net'

/** Whether a port on loopback can be listened on now. */
export const isFree = (port, host = '127.0.0.1') =>
  new Promise((resolve) => {
    const server = createServer()
    server.once('error', () => resolve(false))
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)))
  })

/** The first free port from a number on, by steps. */
export async function freePort(from, { step = 1, tries = 200, host } = {}) {
  for (let port = from; port < from + tries * step; port += step) if (await isFree(port, host)) return port
  throw new Error(`No free port from ${from} on`)
}
