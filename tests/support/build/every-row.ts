/** One row of every table for a firm, written as its owner: what the tests of row security look for from outside. */
import { randomUUID } from 'node:crypto'
import { insertFirm } from './firm'
import { pools } from '../db-setup'

const PARTS = ['wanted', 'consent', 'survey_answer', 'appliance', 'recorded_demand', 'leg', 'circuit', 'earthing_decision', 'departure', 'equipment_fitted', 'load_limit', 'put_back_item', 'inspection_outcome', 'unexpected_sentence', 'statement', 'handover', 'promise']

type Row = [table: string, values: Record<string, unknown>]

/** Rows in an order in which every parent comes before its children; `firm` itself is made first. */
function rowsOf(firmId: string): Row[] {
  const id = () => randomUUID()
  const [customer, premises, person, crew, job, instrument, reading, quote, sealKey, certificate, notice] = [id(), id(), id(), id(), id(), id(), id(), id(), id(), id(), id()] as const
  const sha256 = firmId.replaceAll('-', '').repeat(2)
  return [
    ['person', { id: person, name: 'P', email: `p@${firmId}.example` }],
    ['crew', { id: crew, name: 'Crew' }],
    ['membership', { person_id: person, roles: ['installer'], crew_id: crew }],
    ['qualification', { id: id(), person_id: person, title: 'T', capacities: ['designer'] }],
    ['device', { id: id(), name: 'Tablet' }],
    ['sign_in_session', { id: sha256, person_id: person, expires_at: '2030-01-01' }],
    ['person_token', { id: id(), person_id: person, purpose: 'invitation', token_hash: sha256, expires_at: '2030-01-01' }],
    ['customer', { id: customer, name: 'C' }],
    ['premises', { id: premises, customer_id: customer, postcode: 'UX4 1AA' }],
    ['job', { id: job, ref: 'J0001', customer_id: customer, premises_id: premises, stage: 'enquiry' }],
    ['counter', { name: 'job', last: 1 }],
    ['visit', { id: id(), job_id: job, kind: 'survey', day: '2027-03-02', half: 'am', crew_id: crew }],
    ['field_query', { id: id(), job_id: job, part: 'survey', field: 'cutout_A', question: 'Q', asked_by: person }],
    ['mutation_record', { id: id(), kind: 'k', content_hash: 'h' }],
    ...PARTS.map((table): Row => [table, { job_id: job, key: 'k', content: '{}' }]),
    ['instrument', { id: instrument, name: 'I', serial: 'S', functions: ['loop'] }],
    ['calibration', { id: id(), instrument_id: instrument, done_on: '2026-01-01', good_until: '2027-01-01' }],
    ['reading', { id: reading, job_id: job, test: 'Ze', kind: 'value', shown: '0.2', value: 0.2, unit: 'Ω', person_id: person, device_at: '2027-03-02' }],
    ['reading_confirmation', { reading_id: reading, person_id: person }],
    ['stored_file', { sha256, media_type: 'image/jpeg', bytes: 1 }],
    ['photograph', { id: id(), job_id: job, claim: 'intake', sha256, taken_at: '2027-03-02' }],
    ['signature', { id: id(), job_id: job, capacity: 'designer', person_id: person, name_shown: 'P', way: 'typed', statement: 'S', edition: 'E', record_version: 1 }],
    ['seal_key', { id: sealKey, public_key: 'p', encrypted_private_key: 'e' }],
    ['certificate', { id: certificate, job_id: job, kind: 'installation', subject: 'new-circuit', number: 'T-1', record: '{"a":1}', hash: sha256, previous_hash: '', chain_number: 1, seal: 's', seal_key_id: sealKey, words: 'w', sealed_at: '2027-03-02' }],
    ['paper', { id: id(), job_id: job, kind: 'certificate', source_id: certificate }],
    ['price_item', { id: id(), code: 'C', description: 'D', unit: 'each', net_pence: 1 }],
    ['quote', { id: quote, job_id: job, number: 'Q1' }],
    ['quote_line', { id: id(), quote_id: quote, description: 'D', quantity_thousandths: 1000, unit: 'each', unit_net_pence: 1, vat_bp: 2000 }],
    ['invoice', { id: id(), job_id: job, number: 'I1', kind: 'deposit', content: '{}', gross_pence: 1, due_pence: 1, issued_on: '2027-03-02' }],
    ['payment', { id: id(), job_id: job, pence: 1, way: 'card', outside_id: 'o' }],
    ['checkout', { id: id(), job_id: job, quote_id: quote, pence: 1 }],
    ['notice', { id: notice, job_id: job, kind: 'network-operator', recipient: 'R', route: 'tell-after', reasons: '[]', content: '{}' }],
    ['notice_reply', { id: id(), notice_id: notice, outcome: 'accepted', replied_on: '2027-03-02' }],
    ['customer_link', { id: id(), job_id: job, purpose: 'pack', token_hash: sha256, sent_to: 'c@example.org' }],
    ['outbox_message', { id: id(), message: 'm', recipient: 'c@example.org', content: '{}', dedupe_key: 'd', message_id: '<m>' }],
    ['outside_event', { id: 'e', kind: 'k', content: '{}' }],
    ['audit_event', { number: 1, type: 'job-made', detail: '{}', at: '2027-03-02', previous_hash: '', hash: 'h' }],
    ['audit_head', { number: 1, hash: 'h' }],
    ['table_confirmation', { id: id(), table_id: '41.3', row_key: 'B32', way: 'seen', person_id: person }],
    ['retention_rule', { subject: 'job', years: 6, ground: 'g', since: '2027-01-01' }],
  ]
}

/** The firm's id and the names of its tables, one row in each. */
export async function makeEveryRow(): Promise<{ firmId: string, tables: string[] }> {
  const firmId = randomUUID()
  await insertFirm(firmId)
  const client = await pools.owner.connect()
  try {
    await client.query('begin')
    await client.query('select set_config(\'app.firm_id\', $1, true)', [firmId])
    const rows = rowsOf(firmId)
    for (const [table, values] of rows) {
      const columns = ['firm_id', ...Object.keys(values)]
      await client.query(`insert into ${table} (${columns.join(', ')}) values (${columns.map((_, at) => `$${at + 1}`).join(', ')})`, [firmId, ...Object.values(values)])
    }
    await client.query('commit')
    return { firmId, tables: rows.map(([table]) => table) }
  }
  finally {
    client.release()
  }
}
