import { lookUp } from '#server/db/firm-db'

/** Whether this process can serve: it reaches its database. */
export default defineOpenHandler({}, async () => {
  await lookUp('health', 'select 1 as one', [])
  return { ready: true }
})
