'use client'
import { BoardStrip } from '@/components/drawings/board-strip'
import { Field } from '@/components/ui/field'
import { useFieldState } from '@/components/ui/form-context'
import { BOARD_TYPE_NAMES, BOARD_TYPES, type BoardType } from '@/lib/homes/board-type'

const HINTS: Record<BoardType, string> = {
  rewireable: 'Plastic or porcelain carriers that pull out, with a bare wire in each.',
  cartridge: 'Carriers that pull out, with a small closed tube in each.',
  breakers: 'Small switches in a row, each with a rating such as B32.',
  rcbo: 'Small switches in a row, each with a test button of its own.',
  mixed: 'Some carriers with wire, some switches.',
  unknown: 'Nobody has looked, or it is hard to say.',
}

/** What is on the wall, picked from drawings; the whole picture is the target. */
export function BoardChoice({ defaultValue = 'unknown' }: { defaultValue?: BoardType }) {
  const state = useFieldState('board-type', true)
  const chosen = state.typed ?? defaultValue
  return (
    <Field
      state={state}
      label="What is on the wall?"
      hint="Open the flap of the consumer unit (the fuse box) and look. Do not take a cover off, and pull nothing out."
      group
    >
      <div className="grid gap-2.5 sm:grid-cols-2 xl:grid-cols-3">
        {BOARD_TYPES.map((type, at) => {
          const id = at === 0 ? state.id : `${state.id}-${type}`
          return (
            <div
              key={type}
              className="relative flex flex-col gap-2 rounded-control border border-edge bg-surface p-3 hover:border-copper has-checked:border-copper has-checked:bg-copper-wash has-checked:outline-2 has-checked:-outline-offset-2 has-checked:outline-copper"
            >
              <BoardStrip ways={null} boardType={type} rcdCover="unknown" size="card" decorative />
              <div className="flex items-start gap-2.5">
                <input
                  type="radio"
                  id={id}
                  name="board-type"
                  value={type}
                  defaultChecked={chosen === type}
                  aria-describedby={`${id}-hint`}
                  className="mt-0.5 size-6 shrink-0"
                />
                <div className="min-w-0">
                  <label htmlFor={id} className="block font-semibold before:absolute before:inset-0">
                    {BOARD_TYPE_NAMES[type]}
                  </label>
                  <p id={`${id}-hint`} className="text-sm text-slate">
                    {HINTS[type]}
                  </p>
                </div>
              </div>
            </div>
          )
        })}
      </div>
    </Field>
  )
}
