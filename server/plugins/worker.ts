import { closeDatabase, databasePool, assertCommitsAreKept } from '#server/db/pool'
import { config } from '#server/utils/config'
import { loadPaperFonts } from '#server/utils/paper-fonts'
import { startWorker } from '#server/worker/start-worker'

/** Starts the worker where this process has that role, and closes the database with the server. */
export default defineNitroPlugin((nitro) => {
  if (import.meta.prerender) return
  const { role } = config()
  if (role !== 'worker') void assertCommitsAreKept(databasePool()).catch(stopTheStart)
  const worker = role === 'web' ? null : startWorker(loadPaperFonts).catch(stopTheStart)
  nitro.hooks.hook('close', async () => {
    await (await worker)?.stop()
    await closeDatabase()
  })
})

function stopTheStart(error: Error): undefined {
  console.error(error.message)
  process.exit(1)
}
