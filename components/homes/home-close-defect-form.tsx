'use client'
import { DateField } from '@/components/ui/date-field'
import { Disclosure } from '@/components/ui/disclosure'
import { Form } from '@/components/ui/form'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextAreaField } from '@/components/ui/text-area-field'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type FormAction } from '@/lib/forms/form-state'

type Props = {
  homeId: string
  defectId: string
  /** which defect, for those who listen */
  name: string
  today: CalendarDay
  action: FormAction
}

/** Says of one defect that it was put right, when, and how that is known. Problems stand above it, open or not. */
export function CloseDefectForm({ homeId, defectId, name, today, action }: Props) {
  return (
    <Form action={action} label={`Close ${name}`} className="no-print mt-2">
      {(state) => (
        <Disclosure
          summary="Close this defect"
          open={state.status === 'refused' || state.status === 'failed'}
        >
          <div className="border-l-4 border-line pl-4">
            <input type="hidden" name="homeId" value={homeId} />
            <input type="hidden" name="defectId" value={defectId} />
            <DateField name="closedOn" legend="Put right on" defaultValue={today} />
            <TextAreaField
              name="note"
              label="What was done, and what proves it"
              hint="Who did it, and which certificate or written confirmation there is. It stays with the defect."
              rows={3}
            />
            <SubmitButton size="compact" pendingText="Closing…">
              It was put right
            </SubmitButton>
          </div>
        </Disclosure>
      )}
    </Form>
  )
}
