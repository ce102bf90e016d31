/** A mail server on loopback with the real contract (SMTP), and a page and a list of what came. */
import { createServer, type IncomingMessage, type ServerResponse } from 'node:http'
import { once } from 'node:events'
import { type Readable } from 'node:stream'
import { SMTPServer } from 'smtp-server'
import { inboxPage, letterPage } from './inbox-page'
import { type Mailbox, openMailbox } from './mailbox'

const HOST = '127.0.0.1'
const LARGEST_LETTER = 10 * 1024 * 1024

async function bytesOf(stream: Readable): Promise<Buffer> {
  const pieces: Buffer[] = []
  for await (const piece of stream) pieces.push(piece as Buffer)
  return Buffer.concat(pieces)
}

const smtp = (mailbox: Mailbox) =>
  new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    size: LARGEST_LETTER,
    onAuth: (_auth, _session, done) => done(null, { user: 'anyone' }),
    onData: (stream, session, done) => {
      bytesOf(stream)
        .then((raw) =>
          stream.sizeExceeded
            ? done(Object.assign(new Error('The letter is too large'), { responseCode: 552 }))
            : mailbox
                .take(
                  raw,
                  session.envelope.rcptTo.map((one) => one.address),
                )
                .then(() => done()),
        )
        .catch(done)
    },
  })

function send(response: ServerResponse, status: number, type: string, body: string): void {
  response.writeHead(status, {
    'content-type': `${type}; charset=utf-8`,
    'cache-control': 'no-store',
    'content-security-policy': "default-src 'none'; style-src 'unsafe-inline'; img-src data:",
  })
  response.end(body)
}

/** GET / and /messages/ID for people; GET /messages?to= and DELETE /messages for tests. */
function answer(mailbox: Mailbox, request: IncomingMessage, response: ServerResponse): void {
  const { pathname, searchParams } = new URL(request.url ?? '/', `http://${HOST}`)
  const json = (status: number, value: unknown) =>
    send(response, status, 'application/json', JSON.stringify(value))
  const html = (body: string) => send(response, 200, 'text/html', body)
  if (request.method === 'DELETE' && pathname === '/messages') {
    mailbox.empty()
    return void response.writeHead(204).end()
  }
  if (request.method !== 'GET') return json(405, { error: 'Only GET, and DELETE of /messages' })
  if (pathname === '/') return html(inboxPage(mailbox.list()))
  if (pathname === '/messages') return json(200, mailbox.list(searchParams.get('to') ?? undefined))
  const letter = mailbox.find(pathname.replace('/messages/', ''))
  if (!letter) return json(404, { error: 'No such letter' })
  return request.headers.accept === 'application/json' ? json(200, letter) : html(letterPage(letter))
}

/**
 * Starts both servers; port 0 takes any free one.
 * @returns the addresses, and an end to both
 */
export async function startMail(given: { smtpPort: number; webPort: number; folder: string }) {
  const mailbox = await openMailbox(given.folder)
  const post = smtp(mailbox)
  post.on('error', () => {}) // a client that hangs up is no fault of the server
  const listening = post.listen(given.smtpPort, HOST)
  await once(listening, 'listening')
  const web = createServer((request, response) => answer(mailbox, request, response)).listen(
    given.webPort,
    HOST,
  )
  await once(web, 'listening')
  const portOf = (server: { address: () => unknown }) => (server.address() as { port: number }).port
  return {
    mailUrl: `smtp://${HOST}:${portOf(listening)}`,
    inbox: `http://${HOST}:${portOf(web)}`,
    stop: async () => {
      web.closeAllConnections()
      await Promise.all([
        new Promise<void>((resolve) => post.close(resolve)),
        new Promise((resolve) => web.close(resolve)),
      ])
    },
  }
}
