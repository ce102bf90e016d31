/** A stock list of any length as a CSV file, from the benchmark's own invented homes. */
import { createWriteStream } from 'node:fs'
import { once } from 'node:events'
import { chance } from './chance'

const HEADINGS =
  'Prop Ref,UPRN,No,Street,Town,Postcode,Patch,Tenure,Yr built,Type,Beds,Fuse board,RCD?,Wiring,Rewired,Last EICR,EICR result,C1,C2,FI,Easting,Northing,Notes'
const LETTERS = 'ABDEFGHJLNPQRSTUWXYZ'
const BOARDS = [
  'Rewireable',
  'BS3036',
  'MCBs',
  'Circuit breakers',
  'RCBO',
  'cartridge',
  'n/k',
  'Mixed MCB / rewireable',
]
const COVERS = ['No RCD', 'N', 'sockets', 'All circuits', 'split load', 'n/k']
const TYPES = ['flat', 'mid terrace', 'semi', 'bungalow', 'end terrace']

/** Writes `n` rows to a file. */
export async function writeStockFile(path: string, n: number): Promise<void> {
  const pick = chance(7)
  const one = <T>(some: readonly T[]): T => some[Math.floor(pick.fraction() * some.length)] as T
  const whole = (from: number, to: number) => from + Math.floor(pick.fraction() * (to - from + 1))
  const output = createWriteStream(path)
  output.write(`${HEADINGS}\n`)
  for (let at = 0; at < n; at += 1) {
    const street = Math.floor(at / 120)
    const letters = `${LETTERS[street % 20]}${LETTERS[Math.floor(street / 20) % 20]}`
    const inspected = pick.fraction() < 0.85
    const row = [
      `B-${at + 1}`,
      String(880_000_123_457 + at * 3),
      (at % 120) + 1,
      `Marram ${street} Road`,
      'Marram Bay',
      `YX${1 + (Math.floor(street / 400) % 40)} ${at % 10}${letters}`,
      `Patch ${1 + (street % 20)}`,
      'Social rent',
      whole(1890, 2020),
      one(TYPES),
      whole(1, 4),
      one(BOARDS),
      one(COVERS),
      one(['PVC', 'rubber', '?']),
      pick.fraction() < 0.3 ? whole(1980, 2022) : '',
      inspected ? `${whole(1, 28)}/${whole(1, 12)}/${whole(2016, 2025)}` : 'none on file',
      inspected ? one(['SAT', 'UNSAT']) : '',
      '0',
      inspected && pick.fraction() < 0.2 ? whole(1, 3) : '0',
      '0',
      580_000 + whole(0, 6_000),
      368_000 + whole(0, 6_000),
      '',
    ]
    if (!output.write(`${row.join(',')}\n`)) await once(output, 'drain')
  }
  output.end()
  await once(output, 'finish')
}
