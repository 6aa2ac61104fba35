/** Sends what is due: woken by the database when something is queued, and every few seconds anyhow. */
import type pg from 'pg'
import { workerPool } from '../db/pool'
import { isDatabaseAway } from '../db/database-away'
import { markUnclear, sendMessage, setAside } from './send-message'

const LOOK_EVERY_MS = 4_000
const AT_ONCE = 20
const STUCK_AFTER = '5 minutes'

export interface OutboxLoop { stop(): Promise<void> }

export function startOutboxLoop(): OutboxLoop {
  let isStopped = false
  let wake = () => {}
  let listener: pg.PoolClient | null = null

  async function listen(): Promise<void> {
    if (listener || isStopped) return
    const client = await workerPool().connect()
    listener = client
    client.on('notification', () => wake())
    client.once('end', () => listener = null)
    await client.query('listen outbox')
  }

  async function sendDue(): Promise<number> {
    const { rows } = await workerPool().query<{ firm_id: string, id: string }>('select * from find_due_messages($1)', [AT_ONCE])
    for (const row of rows) {
      if (isStopped) break
      await sendMessage(row.firm_id, row.id).catch((error: Error) => isDatabaseAway(error) ? Promise.reject(error) : setAside(row.firm_id, row.id, error.message))
    }
    return rows.length
  }

  async function showStuck(): Promise<void> {
    const { rows } = await workerPool().query<{ firm_id: string, id: string }>('select * from find_stuck_claims($1::interval)', [STUCK_AFTER])
    for (const row of rows) await markUnclear(row.firm_id, row.id)
  }

  async function run(): Promise<void> {
    while (!isStopped) {
      let sent = 0
      try {
        await listen()
        sent = await sendDue()
        if (!sent) await showStuck()
      }
      catch (error) {
        listener?.release(true)
        listener = null
        console.error('The outbox waits for the database:', (error as Error).message)
      }
      if (!sent && !isStopped) await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, LOOK_EVERY_MS)
        wake = () => {
          clearTimeout(timer)
          resolve()
        }
      })
    }
    listener?.release(true)
  }

  const running = run()
  return {
    async stop() {
      isStopped = true
      wake()
      await running
    },
  }
}
