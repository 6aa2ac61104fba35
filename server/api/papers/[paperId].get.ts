import { setResponseHeaders } from 'h3'
import { and, eq } from 'drizzle-orm'
import { paper } from '#server/db/schema/certificate'
import { fileStore } from '#server/adapters/files'
import { problem } from '#shared/utils/problem'

/** A paper of the firm's as PDF. */
export default defineFirmHandler({ may: 'read-jobs' }, async ({ event, ctx }) => {
  const paperId = uuidParam(event, 'paperId')
  const [row] = await ctx.read(tx => tx.select({ kind: paper.kind, state: paper.state, sha256: paper.sha256 }).from(paper).where(and(eq(paper.firmId, ctx.firmId), eq(paper.id, paperId))))
  if (!row) throw problem('not-found', 'There is no such paper.')
  const bytes = row.sha256 ? await fileStore().get(row.sha256) : null
  if (!bytes) throw problem('try-later', 'This paper is still being made. It takes a few seconds.')
  setResponseHeaders(event, { 'content-type': 'application/pdf', 'content-disposition': `inline; filename="${row.kind}.pdf"`, 'x-content-type-options': 'nosniff' })
  return bytes
})
