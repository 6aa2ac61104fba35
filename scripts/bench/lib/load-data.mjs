/** Firms of 100, 100,000 and a million jobs in the same tables: growth is measured between them, not between databases. */
import { Hash } from '@adonisjs/hash'
import { Scrypt } from '@adonisjs/hash/drivers/scrypt'

const PASSWORD = 'for measuring only'
/** Far below what the product hashes with: signing in is not what is measured here. */
const CHEAP = { cost: 1024, blockSize: 8, parallelization: 1, maxMemory: 32 * 1024 * 1024 }

const firm = (digit, jobs) => ({ id: `00000000-0000-4000-8000-00000000000${digit}`, jobs, email: `office@firm-${jobs}.example`, password: PASSWORD })

export const FIRMS = { small: firm(1, 100), large: firm(2, 100_000), million: firm(3, 1_000_000) }

const uuidOf = letter => `md5('${letter}' || $1::text || i)::uuid`
const STAGES = `(array['enquiry','survey-booked','surveyed','quoted','accepted','install-booked','on-site','ready-to-check','countersigned','handed-over','closed'])[1 + i % 11]`

const ROWS = [
  ['customer', `insert into customer (firm_id, id, name, email) select $1::text::uuid, ${uuidOf('c')}, (array['Ash','Birch','Cedar','Elder','Hazel','Juniper','Larch','Maple','Oak','Rowan','Willow'])[1 + i % 11] || ' ' || i, 'c' || i || '@example.org' from generate_series(1, $2::int) i`],
  ['premises', `insert into premises (firm_id, id, customer_id, address, town, postcode) select $1::text::uuid, ${uuidOf('p')}, ${uuidOf('c')}, i || ' Bench Row', 'Quillham', 'UX' || 1 + i % 20 || ' ' || i % 10 || 'AA' from generate_series(1, $2::int) i`],
  ['job', `insert into job (firm_id, id, ref, customer_id, premises_id, stage, next_day, changed_at) select $1::text::uuid, ${uuidOf('j')}, 'B' || i, ${uuidOf('c')}, ${uuidOf('p')}, ${STAGES}, date '2027-01-01' + i % 90, timestamptz '2026-01-01' + i * interval '7 seconds' from generate_series(1, $2::int) i`],
]

async function loadFirm(client, { id, jobs, email }, passwordHash) {
  await client.query('begin')
  await client.query('set local synchronous_commit = off')
  await client.query('select set_config(\'app.firm_id\', $1, true)', [id])
  await client.query('insert into firm (id, name, address, telephone, email, certificate_prefix, settings) values ($1, $2, \'1 Bench Row\', \'01632 960000\', $3, \'B\', \'{"selfCountersign":false,"depositBp":2500,"vatBp":2000,"quoteDays":30,"schemeMember":true}\')', [id, `Firm of ${jobs} jobs`, email])
  await client.query('insert into person (firm_id, id, name, email, password_hash) values ($1, $1, \'Office\', $2, $3)', [id, email, passwordHash])
  await client.query('insert into membership (firm_id, person_id, roles) values ($1, $1, array[\'office\'])', [id])
  for (const [table, sql] of ROWS) {
    await client.query(sql, [id, jobs])
    // The next table's rows each look up this one: without figures about it they would read all of it, every time.
    await client.query(`analyze ${table}`)
  }
  await client.query('commit')
}

/** Fills the firms asked for; `client` is the owner's connection. */
export async function loadFirms(client, firms) {
  const passwordHash = await new Hash(new Scrypt(CHEAP)).make(PASSWORD)
  for (const each of firms) await loadFirm(client, each, passwordHash)
  await client.query('analyze')
}

/** The place after the job in the middle of a firm's list, as the list itself would name it. */
export async function middleOfList(client, { id, jobs }, stage = null) {
  const { rows: [row] } = await client.query(`select changed_at::text as moment, id from job where firm_id = $1 and ($2::text is null or stage = $2) order by changed_at desc, id desc offset $3 limit 1`, [id, stage, Math.floor(jobs / (stage ? 22 : 2)) - 1])
  return Buffer.from(`${row.moment}|${row.id}`).toString('base64url')
}
