// The anchor of the list: node:http and pg with the same statement, and nothing between them.
import { createServer } from 'node:http'
import pg from 'pg'

const PAGE = 25
const pool = new pg.Pool({ connectionString: process.env.DATABASE_URL, max: 12 })
const text = 'select id, ref, stage, side_state, with_whom, next_day::text, changed_at::text, customer, address, town, postcode from job_page($1, $2, $3, $4, $5)'

createServer(async (request, response) => {
  if (request.url === '/health') return response.end()
  try {
    const { rows } = await pool.query({ name: 'job-page', text, values: [process.env.BENCH_FIRM, null, null, null, PAGE + 1] })
    response.writeHead(200, { 'content-type': 'application/json' }).end(JSON.stringify({ lines: rows.slice(0, PAGE), before: rows.length > PAGE ? rows[PAGE - 1].id : null }))
  }
  catch (error) {
    response.writeHead(500).end(error.message)
  }
}).listen(Number(process.env.PORT), '127.0.0.1')
