/** How the letters of a text file are spelt, told from the whole file: one wrong byte near its end would garble names. */
import { createReadStream } from 'node:fs'
import { refuseFile } from './refuse-file'
import { type TextEncoding } from './sheet-file'

const JUNK = 'The file is neither a workbook nor text. Save it as .xlsx or .csv, then try again.'
/** Text without a byte-order mark whose every other byte is zero is UTF-16; this share of them decides. */
const ZERO_SHARE = 0.3
/** A few stray control characters come with pasted text; more than this share means that it is no text. */
const MOST_CONTROLS = 0.005

function byMark(head: Buffer): TextEncoding | null {
  if (head[0] === 0xef && head[1] === 0xbb && head[2] === 0xbf) return 'utf-8'
  if (head[0] === 0xff && head[1] === 0xfe && !(head[2] === 0 && head[3] === 0)) return 'utf-16le'
  if (head[0] === 0xfe && head[1] === 0xff) return 'utf-16be'
  return null
}

function byZeros(head: Buffer): TextEncoding | null {
  const zeros = [0, 0]
  head.forEach((byte, at) => {
    if (byte === 0) zeros[at % 2] = (zeros[at % 2] ?? 0) + 1
  })
  const [even = 0, odd = 0] = zeros
  if (even + odd === 0) return null
  const half = head.length / 2
  if (odd > half * ZERO_SHARE && even < half * 0.02) return 'utf-16le'
  if (even > half * ZERO_SHARE && odd < half * 0.02) return 'utf-16be'
  throw refuseFile(JUNK)
}

const isControl = (byte: number) =>
  byte < 0x20 && byte !== 0x09 && byte !== 0x0a && byte !== 0x0d && byte !== 0x1a

/**
 * The encoding of a text file: by its byte-order mark, else UTF-8 if every byte of it is lawful UTF-8, else Windows-1252.
 * @param head its first bytes
 * @throws Invalid where it is not text
 */
export async function detectEncoding(path: string, head: Buffer): Promise<TextEncoding> {
  const marked = byMark(head) ?? byZeros(head)
  if (marked !== null && marked !== 'utf-8') return marked
  const decoder = new TextDecoder('utf-8', { fatal: true })
  let lawful = true
  let controls = 0
  let size = 0
  for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
    size += chunk.length
    for (const byte of chunk) {
      if (byte === 0) throw refuseFile(JUNK)
      if (isControl(byte)) controls += 1
    }
    if (!lawful) continue
    try {
      decoder.decode(chunk, { stream: true })
    } catch {
      lawful = false
    }
  }
  if (controls > Math.max(8, size * MOST_CONTROLS)) throw refuseFile(JUNK)
  try {
    if (lawful) decoder.decode()
  } catch {
    lawful = false
  }
  return lawful ? 'utf-8' : 'windows-1252'
}
