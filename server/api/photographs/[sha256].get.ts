import { getRouterParam, setResponseHeaders } from 'h3'
import { and, eq, or } from 'drizzle-orm'
import { storedFile } from '#server/db/schema/reading'
import { fileStore } from '#server/adapters/files'
import { problem } from '#shared/utils/problem'

/** A picture of the firm's, by its hash (or its small copy's). */
export default defineFirmHandler({ may: 'read-jobs' }, async ({ event, ctx }) => {
  const sha256 = getRouterParam(event, 'sha256') ?? ''
  const [file] = await ctx.read(tx => tx.select({ mediaType: storedFile.mediaType }).from(storedFile).where(and(eq(storedFile.firmId, ctx.firmId), or(eq(storedFile.sha256, sha256), eq(storedFile.thumbSha256, sha256)))).limit(1))
  const bytes = file ? await fileStore().get(sha256) : null
  if (!bytes) throw problem('not-found', 'There is no such photograph.')
  setResponseHeaders(event, { 'content-type': 'image/jpeg', 'x-content-type-options': 'nosniff', 'content-security-policy': 'sandbox' })
  return bytes
})
