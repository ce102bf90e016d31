'use client'
import { useRouter } from 'next/navigation'
import { type SubmitEvent, useRef, useState } from 'react'
import { type FieldProblem } from '@/lib/errors/expected'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { FileDrop } from '@/components/ui/file-drop'
import { FormContext } from '@/components/ui/form-context'
import { Progress } from '@/components/ui/progress'

type Answer = { page?: string; problems?: FieldProblem[]; message?: string; fault?: string }
type Sending = { done: number; total: number }

const FORM = 'upload'
const LOST = 'The connection was lost before the file had arrived. Choose “Upload” to send it again.'

/** Sends the file as it is, and tells how far it has got. */
function send(file: File, tell: (sending: Sending) => void): Promise<Answer> {
  return new Promise((resolve) => {
    const request = new XMLHttpRequest()
    request.open('POST', '/api/v1/imports')
    request.setRequestHeader('Content-Type', 'application/octet-stream')
    request.setRequestHeader('X-File-Name', encodeURIComponent(file.name))
    request.responseType = 'json'
    request.upload.onprogress = ({ loaded, total }) => tell({ done: loaded, total })
    request.onload = () => resolve((request.response as Answer | null) ?? { message: LOST })
    request.onerror = () => resolve({ message: LOST })
    request.send(file)
  })
}

const wordsOf = ({ message, fault }: Answer) =>
  message ??
  (fault
    ? `Something went wrong on our side, and nothing was saved. If it happens again, quote ${fault}.`
    : null)

/** Uploads a stock list. Without any script it is an ordinary form that does the same. */
export function UploadForm() {
  const router = useRouter()
  const picked = useRef<File | null>(null)
  const [sending, setSending] = useState<Sending | null>(null)
  const [answer, setAnswer] = useState<Answer>({})
  const [attempt, setAttempt] = useState(0)
  const problems = answer.problems ?? []
  const message = wordsOf(answer)

  const onSubmit = async (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault()
    if (sending) return
    const file = picked.current
    setAttempt((before) => before + 1)
    if (!file) return setAnswer({ problems: [{ field: 'file', problem: 'Choose a file to upload.' }] })
    setAnswer({})
    setSending({ done: 0, total: file.size })
    const next = await send(file, setSending)
    if (next.page) return router.push(next.page)
    setSending(null)
    setAnswer(next)
  }

  return (
    <FormContext value={{ id: FORM, problems, values: null, pending: sending !== null }}>
      {(problems.length > 0 || message) && (
        <ErrorSummary key={attempt} formId={FORM} problems={problems} message={message} link={null} />
      )}
      <form
        action="/api/v1/imports"
        method="post"
        encType="multipart/form-data"
        onSubmit={onSubmit}
        noValidate
      >
        <FileDrop
          name="file"
          label="Stock list"
          hint="Excel (.xlsx) or text (.csv, .tsv), up to 64 MB. Any columns in any order."
          accept=".xlsx,.xlsm,.csv,.tsv,.txt"
          onPick={(file) => {
            picked.current = file
          }}
        />
        {sending ? (
          <Progress
            label={sending.done < sending.total ? 'Uploading' : 'Looking into the file'}
            done={Math.round(sending.done / 1024)}
            total={Math.max(1, Math.round(sending.total / 1024))}
            unit="kB"
          />
        ) : (
          <Button type="submit">Upload and choose columns</Button>
        )}
      </form>
    </FormContext>
  )
}
