// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { HomeFactsForm } from '@/components/homes/home-facts-form'
import { touchedFacts } from '@/components/homes/home-touched-facts'
import { fieldsOf } from '@/lib/forms/fields-of'
import { type FormAction, IDLE } from '@/lib/forms/form-state'
import { typedValues } from '@/lib/forms/typed-values'
import { type FactKind } from '@/lib/homes/fact'
import { A_KNOWN_HOME, aFact, aHomeShown } from './home-shown-example'

vi.setConfig({ testTimeout: 60_000 })
afterEach(cleanup)

const factsWith = (values: Partial<Record<FactKind, string>>, by = 'Ada Marsh') =>
  aHomeShown(A_KNOWN_HOME).facts.map((fact) => {
    const value = values[fact.kind]
    return value === undefined
      ? fact
      : { ...fact, current: aFact(fact.kind, value, { id: `${fact.kind}-${value}`, recordedBy: by }) }
  })

const asked: unknown[] = []
const conflicts: FormAction = async (_state, form) => {
  const fields = fieldsOf(form.entries())
  asked.push(touchedFacts(fields))
  return {
    ...IDLE,
    status: 'refused',
    message: 'Wiring: somebody else has changed this.',
    values: typedValues(fields),
  }
}
/** A form of this size takes its time where the machine is busy. */
const PATIENCE = { timeout: 15_000 }
const refused = () => screen.findByRole('alert', undefined, PATIENCE)
const choice = (name: string) => screen.getByRole<HTMLSelectElement>('combobox', { name })
const line = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name })

describe('correcting facts', () => {
  it('sends on only the facts that were changed, with what was on screen of them', async () => {
    const user = userEvent.setup()
    render(
      <HomeFactsForm
        homeId="home-1"
        facts={factsWith({ wiring: 'pvc', bedrooms: '3' })}
        action={conflicts}
      />,
    )
    await user.selectOptions(choice('Wiring'), 'rubber')
    await user.click(screen.getByRole('button', { name: 'Save the facts' }))
    await refused()
    expect(asked.at(-1)).toMatchObject({ homeId: 'home-1', wiring: 'rubber', 'seen-wiring': 'wiring-pvc' })
    expect(asked.at(-1)).not.toHaveProperty('bedrooms')
    expect(asked.at(-1)).not.toHaveProperty('seen-board-type')
  })

  it('shows both values where somebody else was first, and lets what nobody touched follow', async () => {
    const user = userEvent.setup()
    const form = (facts: ReturnType<typeof factsWith>) => (
      <HomeFactsForm homeId="home-1" facts={facts} action={conflicts} />
    )
    const { rerender } = render(form(factsWith({ wiring: 'pvc', 'dwelling-type': 'flat' })))
    await user.selectOptions(choice('Wiring'), 'rubber')
    await user.click(screen.getByRole('button', { name: 'Save the facts' }))
    await refused()
    rerender(form(factsWith({ wiring: 'lead', 'dwelling-type': 'maisonette' }, 'Tom Reed')))

    const notice = screen.getByText('Wiring has changed since you opened this page').parentElement
    expect(notice?.textContent).toContain('It was PVC. Tom Reed put Lead sheathed on record')
    expect(notice?.textContent).toContain('You chose Rubber (VIR or TRS)')
    expect(choice('Wiring').value).toBe('rubber')
    expect(choice('Dwelling').value).toBe('maisonette')

    await user.click(screen.getByRole('button', { name: 'Save the facts' }))
    await waitFor(
      () => expect(asked.at(-1)).toMatchObject({ wiring: 'rubber', 'seen-wiring': 'wiring-lead' }),
      PATIENCE,
    )
    expect(asked.at(-1)).not.toHaveProperty('dwelling-type')
  })
})

describe('the ways of a board', () => {
  it('are drawn in words as they are pressed, and sent in capitals', async () => {
    const user = userEvent.setup()
    render(<HomeFactsForm homeId="home-1" facts={factsWith({})} action={conflicts} />)
    for (const key of [/rewireable fuse/, /an RCD begins/, /circuit breaker/])
      await user.click(screen.getByRole('button', { name: key }))
    expect(screen.getByText(/Close the RCD with \]/)).toBeTruthy()
    await user.click(screen.getByRole('button', { name: /the RCD ends/ }))
    const ways = line('Ways, from the main switch on')
    expect(ways.value).toBe('R[B]')
    expect(screen.getByText(/2 ways: 1 rewireable, 1 breaker.*“Mixed, some rewireable”.*“Part”/)).toBeTruthy()
    await user.click(screen.getByRole('button', { name: /take the last one away/ }))
    await user.type(ways, ' b ]')
    await user.click(screen.getByRole('button', { name: 'Save the facts' }))
    await waitFor(() => expect(asked.at(-1)).toMatchObject({ ways: 'R[BB]', 'seen-ways': '' }), PATIENCE)
    expect(ways.isConnected ? ways.value : line('Ways, from the main switch on').value).toBe('R[B b ]')
  })
})
