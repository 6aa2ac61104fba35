import { keepFile, MOST_PHOTOGRAPH_BYTES } from '#server/services/photographs/keep-file'
import { readBytes } from '#server/utils/read-bytes'

/** Takes a photograph's bytes; which claim it answers travels as a mutation of its own. */
export default defineJobHandler({ may: 'take-photographs' }, async ({ event, ctx }) => keepFile(ctx.firmId, await readBytes(event, MOST_PHOTOGRAPH_BYTES)))
