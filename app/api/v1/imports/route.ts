import { answer, answerRefusal, answerSignedOut } from '@/app/api/read'
import { optionalActor } from '@/app/session'
import { Invalid, NotAllowed } from '@/lib/errors/expected'
import { today } from '@/lib/platform/clock'
import { env } from '@/lib/platform/env'
import { MOST_BYTES, receiveFile } from '@/lib/use-cases/imports/receive-file'

/** A form posted by another site carries that site's origin; ours carries ours. */
function demandOwnOrigin(request: Request): void {
  const origin = request.headers.get('origin')
  if (origin !== null && origin !== new URL(env().NEXTAUTH_URL).origin)
    throw new NotAllowed('This upload came from another site.')
}

/** The name that the header holds, percent-encoded; one that is not is taken as it stands. */
function nameOf(header: string): string {
  try {
    return decodeURIComponent(header)
  } catch {
    return header
  }
}

/** The upload itself: as the whole body with its name beside it, or as an ordinary form where there is no script. */
async function uploadOf(request: Request) {
  const isForm = request.headers.get('content-type')?.startsWith('multipart/form-data') ?? false
  if (!isForm)
    return {
      isForm,
      name: nameOf(request.headers.get('x-file-name') ?? ''),
      content: request.body,
    }
  if (Number(request.headers.get('content-length') ?? Infinity) > MOST_BYTES)
    throw new Invalid([{ field: 'file', problem: `The file is larger than ${MOST_BYTES / 1024 / 1024} MB.` }])
  const file = (await request.formData()).get('file')
  return file instanceof File && file.size > 0
    ? { isForm, name: file.name, content: file.stream() }
    : { isForm, name: '', content: null }
}

/** Takes a stock list in, and says which import it has become. */
export async function POST(request: Request): Promise<Response> {
  try {
    const actor = await optionalActor()
    if (!actor) return answerSignedOut()
    demandOwnOrigin(request)
    const { isForm, ...upload } = await uploadOf(request)
    const { id } = await receiveFile(actor, upload, today())
    const page = `/imports/${id}`
    return isForm
      ? new Response(null, { status: 303, headers: { Location: page } })
      : answer({ id, page }, 201)
  } catch (thrown) {
    return answerRefusal(thrown)
  }
}
