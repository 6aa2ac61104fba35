import { uuidv7 } from 'uuidv7'
import type { PhotographRow } from '#shared/types/record'

/** Takes and takes away the photographs of a job: bytes by their own route, what they answer as a change of the record. */
export function usePhotographs(jobId: string) {
  const job = useJobRecord(jobId)
  const signInAgain = useSignInAgain()
  /** Small copies of pictures that this page has just sent, until the record is read again. */
  const thumbs = useState<Record<string, string>>('thumbs', () => ({}))
  const isSending = ref<Record<string, boolean>>({})
  const problems = ref<Record<string, string>>({})

  /** Sends the picture, then keeps it for the claim; the one it replaces is taken away only afterwards. */
  async function take(claim: string, file: File, replaces?: PhotographRow): Promise<void> {
    const { [claim]: _, ...others } = problems.value
    problems.value = others
    isSending.value = { ...isSending.value, [claim]: true }
    try {
      const picture = await shrinkPicture(file)
      const type = ['image/jpeg', 'image/png', 'image/webp'].includes(picture.type) ? picture.type : 'application/octet-stream'
      const { sha256, thumbSha256 } = await callApi<{ sha256: string, thumbSha256: string }>(`/api/jobs/${jobId}/photographs`, { method: 'POST', body: new Blob([picture], { type }) })
      thumbs.value = { ...thumbs.value, [sha256]: thumbSha256 }
      const takenAt = new Date(Math.min(file.lastModified || Date.now(), Date.now())).toISOString()
      await job.mutate('keep-photograph', { id: uuidv7(), claim, sha256, takenAt })
      if (replaces) await job.mutate('remove-photograph', { id: replaces.id })
    }
    catch (error) {
      const problem = readProblem(error)
      if (problem.code === 'not-signed-in') signInAgain.value = true
      problems.value = { ...problems.value, [claim]: problem.code === 'try-later' ? 'The photograph was not sent: there is no connection just now. Take or choose it again in a moment.' : problem.message }
    }
    finally {
      isSending.value = { ...isSending.value, [claim]: false }
    }
  }

  const remove = (photograph: PhotographRow) => job.mutate('remove-photograph', { id: photograph.id })
  /** Taken away by mistake: the same picture answers its claim again. */
  const bringBack = ({ claim, sha256, takenAt }: PhotographRow) => job.mutate('keep-photograph', { id: uuidv7(), claim, sha256, takenAt: new Date(takenAt).toISOString() })
  const addressOf = (photograph: PhotographRow) => `/api/photographs/${photograph.sha256}`
  const thumbOf = (photograph: PhotographRow) => `/api/photographs/${photograph.thumbSha256 ?? thumbs.value[photograph.sha256] ?? photograph.sha256}`

  return { take, remove, bringBack, addressOf, thumbOf, isSending, problems }
}
