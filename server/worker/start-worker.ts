/** What runs in the worker role and nowhere else: the outbox, papers, timed work, and a health answer on loopback. */
import { createServer, type Server } from 'node:http'
import { Logger, run, type Runner } from 'graphile-worker'
import { warmUpPdf, type LoadFonts } from '../adapters/pdf'
import { assertCommitsAreKept, workerPool } from '../db/pool'
import { config } from '../utils/config'
import { makePaper } from './make-paper'
import { startOutboxLoop } from './outbox-loop'

const SWEEP_EVERY_MS = 60_000

const quiet = new Logger(() => (level, message) => {
  if (level === 'error') console.error(message)
})

export async function startWorker(loadFonts: LoadFonts): Promise<{ stop(): Promise<void> }> {
  await assertCommitsAreKept(workerPool())
  await warmUpPdf(await loadFonts())
  const runner: Runner = await run({
    pgPool: workerPool(), concurrency: 1, noHandleSignals: true, pollInterval: 1_000, logger: quiet,
    taskList: { 'make-paper': payload => makePaper(payload as { firmId: string, paperId: string }, loadFonts) },
  })
  const outbox = startOutboxLoop()
  const sweep = setInterval(() => void makeMissing(loadFonts), SWEEP_EVERY_MS)
  const health = answerHealth()
  return {
    async stop() {
      clearInterval(sweep)
      await new Promise(resolve => health.close(resolve))
      await outbox.stop()
      await runner.stop()
    },
  }
}

/** A paper that was asked for and never made (its job was lost) is found here. */
async function makeMissing(loadFonts: LoadFonts): Promise<void> {
  try {
    const { rows } = await workerPool().query<{ firm_id: string, id: string }>('select * from find_papers_to_make($1)', [5])
    for (const row of rows) await makePaper({ firmId: row.firm_id, paperId: row.id }, loadFonts)
  }
  catch (error) {
    console.error('Papers wait:', (error as Error).message)
  }
}

function answerHealth(): Server {
  const server = createServer((request, response) => {
    const isHealth = request.url === '/health'
    response.writeHead(isHealth ? 200 : 404, { 'content-type': 'application/json' }).end(JSON.stringify({ ready: isHealth }))
  })
  return server.listen(config().workerHealthPort, '127.0.0.1')
}
