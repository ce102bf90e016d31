// @vitest-environment happy-dom
import { cleanup, render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { CheckboxField } from '@/components/ui/checkbox-field'
import { DateField } from '@/components/ui/date-field'
import { Form } from '@/components/ui/form'
import { SelectField } from '@/components/ui/select-field'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { fieldsOf } from '@/lib/forms/fields-of'
import { type FormAction, IDLE } from '@/lib/forms/form-state'
import { typedValues } from '@/lib/forms/typed-values'

const refuses: FormAction = async (_state, form) => ({
  ...IDLE,
  status: 'refused',
  problems: [
    { field: 'email', problem: 'Enter an e-mail address.' },
    { field: 'inspectedOn', problem: 'Enter a day that exists.' },
  ],
  values: typedValues(fieldsOf(form.entries())),
})

function show(action: FormAction, onDone?: () => void) {
  render(
    <Form action={action} onDone={onDone}>
      <TextField name="email" label="E-mail address" hint="We send a link to it." />
      <SelectField
        name="cover"
        label="RCD cover"
        choices={[
          { value: '', label: 'Not known' },
          { value: 'all', label: 'All circuits' },
        ]}
      />
      <DateField name="inspectedOn" legend="When was it inspected?" />
      <CheckboxField name="digest" label="Send a digest" />
      <SubmitButton pendingText="Saving…">Save</SubmitButton>
    </Form>,
  )
}
const box = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name })

async function fillAndSend() {
  const user = userEvent.setup()
  await user.type(box('E-mail address'), 'ada at example')
  await user.selectOptions(screen.getByRole('combobox'), 'all')
  await user.type(box('Day'), '31')
  await user.type(box('Month'), 'feb')
  await user.click(screen.getByRole('checkbox'))
  await user.click(screen.getByRole('button', { name: 'Save' }))
  return user
}

function expectAllStillTyped() {
  expect(box('E-mail address').value).toBe('ada at example')
  expect(box('Day').value).toBe('31')
  expect(box('Month').value).toBe('feb')
  expect(screen.getByRole<HTMLSelectElement>('combobox').value).toBe('all')
  expect(screen.getByRole<HTMLInputElement>('checkbox').checked).toBe(true)
}

describe('a form', () => {
  beforeEach(() => {
    document.title = 'Invite · Fuseward'
  })
  afterEach(cleanup)

  it('gives the focus to a summary that leads to each field, and marks the title', async () => {
    show(refuses)
    const user = await fillAndSend()
    const summary = await screen.findByRole('alert', { name: 'There is a problem' })
    expect(document.activeElement).toBe(summary)
    expect(document.title).toBe('Error: Invite · Fuseward')
    await user.click(screen.getByRole('link', { name: 'Enter a day that exists.' }))
    expect(document.activeElement).toBe(box('Day'))
  })

  it('keeps all that was typed when it is refused', async () => {
    show(refuses)
    await fillAndSend()
    await screen.findByRole('alert')
    expectAllStillTyped()
  })

  it('ties hint and problem to the field', async () => {
    show(refuses)
    await fillAndSend()
    await screen.findByRole('alert')
    const described = box('E-mail address').getAttribute('aria-describedby')?.split(' ') ?? []
    expect(described.map((id) => document.getElementById(id)?.textContent)).toEqual([
      'We send a link to it.',
      'Error: Enter an e-mail address.',
    ])
    expect(box('E-mail address').getAttribute('aria-invalid')).toBe('true')
  })

  it('says that the connection was lost, and loses nothing', async () => {
    show(() => Promise.reject(new TypeError('Failed to fetch')))
    await fillAndSend()
    expect((await screen.findByRole('alert')).textContent).toContain('connection was lost')
    expectAllStillTyped()
  })

  it('says that it is done, empties itself, and calls back once', async () => {
    const onDone = vi.fn()
    show(async () => ({ ...IDLE, status: 'done', message: 'Invited.' }), onDone)
    await fillAndSend()
    expect(await screen.findByText('Invited.')).toBeTruthy()
    await waitFor(() => expect(box('E-mail address').value).toBe(''))
    expect(onDone).toHaveBeenCalledTimes(1)
    expect(document.title).toBe('Invite · Fuseward')
  })

  it('is not sent twice while it is on its way', async () => {
    let answer = (_: typeof IDLE) => {}
    const action = vi.fn(() => new Promise<typeof IDLE>((resolve) => (answer = resolve)))
    show(action)
    const user = await fillAndSend()
    const waiting = await screen.findByRole('button', { name: /Saving/ })
    await user.click(waiting)
    expect(action).toHaveBeenCalledTimes(1)
    answer({ ...IDLE, status: 'done' })
    await screen.findByRole('button', { name: 'Save' })
  })
})
