import * as z from 'zod'
import { checkForm } from '#shared/schemas/customer'
import { checkCertificate } from '#server/services/links/check-certificate'
import { problem } from '#shared/utils/problem'

const asked = z.object({ id: z.string().optional(), words: z.string().optional(), number: z.string().optional() })

export default defineOpenHandler({}, ({ event }) => {
  const { id, words, number } = asked.parse(Object.fromEntries(Object.entries(getQuery(event)).filter(([, value]) => typeof value === 'string' && value !== '')))
  const parsed = checkForm.safeParse(id === undefined ? { words, ...(number && { number }) } : { id })
  if (parsed.success) return checkCertificate(parsed.data)
  if (id !== undefined) return { state: 'not-ours' as const }
  throw problem('check-answers', 'Enter the four words from the foot of the certificate.', { fields: { words: 'Enter the four words from the foot of the certificate' } })
})
