import { lookUp } from '../../db/firm-db'
import type { JobLine, JobPage } from '../../../shared/schemas/job'
import { problem } from '../../../shared/utils/problem'
import type { FirmContext } from '../firm-context'

const PAGE = 25
const COLUMNS = 'id, ref, stage, side_state, with_whom, next_day::text, changed_at::text, customer, address, town, postcode'

interface Row { [column: string]: unknown, id: string, ref: string, stage: JobLine['stage'], side_state: string | null, with_whom: string, next_day: string | null, changed_at: string, customer: string, address: string, town: string, postcode: string }

const toLine = (row: Row): JobLine => ({ id: row.id, ref: row.ref, stage: row.stage, sideState: row.side_state, withWhom: row.with_whom, nextDay: row.next_day, changedAt: row.changed_at, customer: row.customer, address: row.address, town: row.town, postcode: row.postcode })

/** The place after a page's last line: its moment to the microsecond and its id. */
const toCursor = (row: Row) => Buffer.from(`${row.changed_at}|${row.id}`).toString('base64url')

function readCursor(text: string): [string, string] {
  const [moment, id] = Buffer.from(text, 'base64url').toString().split('|')
  if (!moment || !/^\d{4}-\d\d-\d\d[ T][\d:.+-]{5,25}$/.test(moment) || !id || !/^[0-9a-f-]{36}$/.test(id)) throw problem('check-answers', 'That page of the list is not there. Start from the newest.')
  return [moment, id]
}

/** Newest first, a page at a time; one statement whatever the firm's size. */
export async function listJobs(ctx: FirmContext, query: { stage?: string, search?: string, before?: string }): Promise<JobPage> {
  if (query.search) {
    const words = query.search.replace(/[\\%_]/g, sign => `\\${sign}`)
    const rows = await lookUp<Row>('search-jobs', `select ${COLUMNS} from search_jobs($1, $2, $3)`, [ctx.firmId, words, PAGE * 2])
    return { lines: rows.map(toLine), before: null }
  }
  const [moment, id] = query.before ? readCursor(query.before) : [null, null]
  const rows = await lookUp<Row>('job-page', `select ${COLUMNS} from job_page($1, $2, $3, $4, $5)`, [ctx.firmId, query.stage ?? null, moment, id, PAGE + 1])
  const shown = rows.slice(0, PAGE)
  return { lines: shown.map(toLine), before: rows.length > PAGE ? toCursor(shown.at(-1)!) : null }
}
