/** The rows of one sheet of a workbook, as a stream. */
import { type Cell, type SheetRow } from '@/lib/imports/cell'
import { parseXml } from './parse-xml'
import { unescapeText } from './read-workbook-parts'
import { refuseFile } from './refuse-file'
import { MOST_COLUMNS } from './sheet-file'

const LONGEST_CELL = 100_000

export type WorkbookContext = {
  readonly strings: readonly string[]
  readonly dateStyles: ReadonlySet<number>
  readonly epoch: 1900 | 1904
}

/** Column [0 upwards] of a cell's address: "C4" is 2. */
function columnOf(address: string): number {
  let column = 0
  for (let at = 0; at < address.length; at++) {
    const code = address.charCodeAt(at)
    const letter = code >= 97 ? code - 96 : code - 64
    if (letter < 1 || letter > 26) break
    column = column * 26 + letter
  }
  return column - 1
}

function valueOf(type: string, style: number, text: string, context: WorkbookContext): Cell {
  if (text === '') return null
  switch (type) {
    case 's':
      return context.strings[Number(text)] || null
    case 'b':
      return text === '1' || text === 'true'
    case 'e':
      return { error: text }
    case 'str':
    case 'inlineStr':
      return unescapeText(text)
    case 'd':
      return text
    default: {
      const number = Number(text)
      if (!Number.isFinite(number)) return text
      return context.dateStyles.has(style) ? { serial: number, epoch: context.epoch } : number
    }
  }
}

/** Gathers cells and rows from the events of the XML. A formula's own text is passed over: its stored result counts. */
class RowGatherer {
  rows: SheetRow[] = []
  private number = 0
  private cells: Cell[] = []
  private column = -1
  private type = 'n'
  private style = 0
  private value = ''
  private takes = false
  private inPhonetic = false

  constructor(private readonly context: WorkbookContext) {}

  open(name: string, attributes: Readonly<Record<string, string>>): void {
    if (name === 'c') {
      const address = attributes['r']
      this.column = address ? columnOf(address) : this.column + 1
      this.type = attributes['t'] ?? 'n'
      this.style = Number(attributes['s'] ?? 0)
      this.value = ''
    } else if (name === 'v' || name === 't') this.takes = !this.inPhonetic
    else if (name === 'rPh') this.inPhonetic = true
    else if (name === 'row') {
      this.number = Number(attributes['r'] ?? this.number + 1)
      this.cells = []
      this.column = -1
    }
  }

  text(text: string): void {
    if (!this.takes) return
    this.value += text
    if (this.value.length > LONGEST_CELL) throw refuseFile(`A cell in row ${this.number} is far too long.`)
  }

  close(name: string): void {
    if (name === 'v' || name === 't') this.takes = false
    else if (name === 'rPh') this.inPhonetic = false
    else if (name === 'c') this.endCell()
    else if (name === 'row') this.rows.push({ number: this.number, cells: this.cells })
  }

  private endCell(): void {
    const cell = valueOf(this.type, this.style, this.value, this.context)
    if (cell === null) return
    if (this.column < 0 || this.column >= MOST_COLUMNS)
      throw refuseFile(`Row ${this.number} has more than ${MOST_COLUMNS} columns.`)
    while (this.cells.length < this.column) this.cells.push(null)
    this.cells[this.column] = cell
  }
}

/**
 * The rows of a sheet in their order, with the numbers that the person sees; rows that the file leaves out are empty.
 * @throws Invalid where the part is damaged or a row is too wide
 */
export async function* readSheetRows(
  part: AsyncIterable<Buffer>,
  context: WorkbookContext,
): AsyncGenerator<SheetRow> {
  const gatherer = new RowGatherer(context)
  const events = parseXml(part, {
    open: (name, attributes) => gatherer.open(name, attributes),
    text: (text) => gatherer.text(text),
    close: (name) => gatherer.close(name),
  })
  for await (const _ of events) {
    void _
    const gathered = gatherer.rows
    gatherer.rows = []
    yield* gathered
  }
}
