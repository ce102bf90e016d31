'use client'
import { type ReactNode, useState } from 'react'
import { BoardStrip } from '@/components/drawings/board-strip'
import { controlClass, Field } from '@/components/ui/field'
import { useFieldState } from '@/components/ui/form-context'
import { boardTypeOfWays } from '@/lib/electrical/board-type-of-ways'
import { type WayDevice, waysOf } from '@/lib/electrical/consumer-unit'
import { rcdCoverOfWays } from '@/lib/electrical/rcd-cover-of-ways'
import { waysInWords } from '@/lib/electrical/ways-in-words'
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'
import { RCD_COVER_NAMES } from '@/lib/homes/rcd-cover'
import { WayDeviceDrawing } from './home-way-device'

const KEYS: readonly { readonly letter: string; readonly device: WayDevice; readonly words: string }[] = [
  { letter: 'R', device: 'rewireable', words: 'rewireable fuse' },
  { letter: 'C', device: 'cartridge', words: 'cartridge fuse' },
  { letter: 'B', device: 'breaker', words: 'circuit breaker' },
  { letter: 'O', device: 'rcbo', words: 'RCBO' },
  { letter: 'X', device: 'blank', words: 'blank plate' },
  { letter: 'U', device: 'unknown', words: 'not known' },
]

const tidy = (text: string) => text.replace(/\s+/g, '').toUpperCase()

/** What the ways add up to, in words; or what is still missing from them. */
function reading(code: string): string {
  if (code === '') return 'No way given: only the type is known.'
  const ways = waysOf(code)
  if (!ways) {
    const isOpen = (code.match(/\[/g)?.length ?? 0) > (code.match(/\]/g)?.length ?? 0)
    return isOpen
      ? 'Close the RCD with ] after the last way behind it.'
      : 'Not a board yet: use the letters below.'
  }
  const type = boardTypeOfWays(ways)
  const cover = rcdCoverOfWays(ways)
  const shown = [
    type === 'unknown' ? null : `type “${BOARD_TYPE_NAMES[type]}”`,
    cover === 'unknown' ? null : `RCD cover “${RCD_COVER_NAMES[cover]}”`,
  ].filter(Boolean)
  return `${waysInWords(ways)}.${shown.length > 0 ? ` This makes the ${shown.join(' and the ')}.` : ''}`
}

function Key({ children, onPress, words }: { children: ReactNode; onPress: () => void; words: ReactNode }) {
  return (
    <li>
      <button
        type="button"
        onClick={onPress}
        className="flex min-h-12 w-full items-center gap-3 rounded-control border border-line bg-surface px-2.5 py-1 text-left hover:border-copper hover:bg-copper-wash"
      >
        {children}
        <span className="min-w-0 text-sm">{words}</span>
      </button>
    </li>
  )
}

const glyph = 'figures flex h-9 w-5 shrink-0 items-center justify-center text-xl font-bold text-verdigris'

type Props = { defaultValue: string; hint?: ReactNode; label?: ReactNode }

/**
 * The ways of a consumer unit, from the main switch on: typed as letters, or pressed one by one, and drawn as they are
 * given. Without any script it is a line to type in, with the key under it.
 */
export function WaysField({ defaultValue, hint, label = 'Ways, from the main switch on' }: Props) {
  const state = useFieldState('ways', hint !== undefined)
  const [code, setCode] = useState(state.typed ?? defaultValue)
  const tidied = tidy(code)
  const ways = waysOf(tidied)
  const add = (text: string) => setCode(tidied + text)
  return (
    <Field state={state} label={label} hint={hint}>
      <input
        id={state.id}
        name="ways"
        value={code}
        onChange={(event) => setCode(event.target.value)}
        maxLength={60}
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        aria-describedby={state.describedBy}
        aria-invalid={state.problem ? true : undefined}
        className={controlClass(state.problem, 'max-w-md figures tracking-[0.15em] uppercase')}
      />
      <div className="mt-3 border border-dashed border-edge bg-surface p-3">
        {ways ? (
          <BoardStrip
            ways={tidied}
            boardType={boardTypeOfWays(ways)}
            rcdCover={rcdCoverOfWays(ways)}
            size="card"
            decorative
          />
        ) : (
          <div className="h-[3.25rem]" />
        )}
        <p role="status" className="mt-1 text-sm text-slate">
          {reading(tidied)}
        </p>
      </div>
      <ul className="mt-3 grid grid-cols-2 gap-1.5 sm:grid-cols-3" aria-label="Add a way">
        {KEYS.map(({ letter, device, words }) => (
          <Key
            key={letter}
            onPress={() => add(letter)}
            words={
              <>
                <b className="figures">{letter}</b> {words}
              </>
            }
          >
            <WayDeviceDrawing device={device} />
          </Key>
        ))}
        <Key onPress={() => add('[')} words="an RCD begins: the ways after it are behind it">
          <span aria-hidden="true" className={glyph}>
            [
          </span>
        </Key>
        <Key onPress={() => add(']')} words="the RCD ends">
          <span aria-hidden="true" className={glyph}>
            ]
          </span>
        </Key>
        <Key onPress={() => setCode(tidied.slice(0, -1))} words="take the last one away">
          <span aria-hidden="true" className={glyph}>
            ←
          </span>
        </Key>
      </ul>
    </Field>
  )
}
