import { type Choice } from '@/components/ui/select-field'
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'
import { DWELLING_TYPE_NAMES } from '@/lib/homes/dwelling-type'
import { INSPECTION_RECORD_NAMES } from '@/lib/homes/fact-value'
import { NATION_NAMES } from '@/lib/homes/nation'
import { RCD_COVER_NAMES } from '@/lib/homes/rcd-cover'
import { TENURE_NAMES } from '@/lib/homes/tenure'
import { WIRING_NAMES } from '@/lib/homes/wiring'
import { type ChosenKind } from './home-touched-facts'

const choicesOf = (names: Readonly<Record<string, string>>): readonly Choice[] =>
  Object.entries(names).map(([value, label]) => ({ value, label }))

/** What each fact can be, "Not known" among it. */
export const FACT_CHOICES: Record<ChosenKind, readonly Choice[]> = {
  'board-type': choicesOf(BOARD_TYPE_NAMES),
  'rcd-cover': choicesOf(RCD_COVER_NAMES),
  wiring: choicesOf(WIRING_NAMES),
  'dwelling-type': choicesOf(DWELLING_TYPE_NAMES),
  'inspection-record': choicesOf(INSPECTION_RECORD_NAMES),
}

export const NATION_CHOICES = choicesOf(NATION_NAMES)
export const TENURE_CHOICES = choicesOf(TENURE_NAMES)
