/** XML parts of a workbook, read as a stream of events. No entity is ever expanded and no document type accepted. */
import { SaxesParser, type SaxesTagPlain } from 'saxes'
import { refuseFile } from './refuse-file'

export type XmlHandlers = {
  readonly open?: (name: string, attributes: Readonly<Record<string, string>>) => void
  readonly text?: (text: string) => void
  readonly close?: (name: string) => void
}

const DAMAGED = 'A part of the workbook is damaged. Save it again, or export it as .csv.'

/** Some programs write `x:row` for `row`. */
const localName = (name: string) => {
  const colon = name.indexOf(':')
  return colon < 0 ? name : name.slice(colon + 1)
}

const encodingOf = (chunk: Buffer) =>
  chunk[0] === 0xff && chunk[1] === 0xfe
    ? 'utf-16le'
    : chunk[0] === 0xfe && chunk[1] === 0xff
      ? 'utf-16be'
      : 'utf-8'

/**
 * Parses a part and calls the handlers; yields after each chunk, so that the caller can hand on what has gathered.
 * @throws Invalid where the XML is not well formed or declares a document type
 */
export async function* parseXml(part: AsyncIterable<Buffer>, handlers: XmlHandlers): AsyncGenerator<void> {
  const parser = new SaxesParser({ xmlns: false, position: false })
  parser.on('error', () => {
    throw refuseFile(DAMAGED)
  })
  parser.on('doctype', () => {
    throw refuseFile(DAMAGED)
  })
  const { open, text, close } = handlers
  if (open) parser.on('opentag', (tag: SaxesTagPlain) => open(localName(tag.name), tag.attributes))
  if (close) parser.on('closetag', (tag: SaxesTagPlain) => close(localName(tag.name)))
  if (text) {
    parser.on('text', text)
    parser.on('cdata', text)
  }
  let decoder: TextDecoder | null = null
  for await (const chunk of part) {
    decoder ??= new TextDecoder(encodingOf(chunk))
    parser.write(decoder.decode(chunk, { stream: true }))
    yield
  }
  parser.write(decoder?.decode() ?? '').close()
  yield
}

/** Parses a part to its end; nothing happens where there is no such part. */
export async function parseWholeXml(
  part: AsyncIterable<Buffer> | null,
  handlers: XmlHandlers,
): Promise<void> {
  if (!part) return
  for await (const _ of parseXml(part, handlers)) void _
}
