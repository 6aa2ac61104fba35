/** The invented firm: its people, crews, kit and prices. Town, names and numbers belong to nobody; telephone numbers are Ofcom's for drama. */
import { randomUUID } from 'node:crypto'
import { Hash } from '@adonisjs/hash'
import { Scrypt } from '@adonisjs/hash/drivers/scrypt'
import { DEMO_PASSWORD } from '../demo-sign-ins.mjs'
import { INSTRUMENTS, PEOPLE, PRICES, RETENTION } from './firm.data.mjs'

/** As `auth.hash` in nuxt.config.ts, so that a sign-in need not hash anew. */
const SCRYPT = { cost: 131_072, blockSize: 8, parallelization: 1, maxMemory: 256 * 1024 * 1024 }

const SETTINGS = { selfCountersign: false, depositBp: 2_500, vatBp: 2_000, quoteDays: 30, schemeMember: true }

/** The firm's row is the one thing that the web's role may not make. Row security holds the owner too, so the firm is named first. */
async function insertFirm(owner, firm) {
  await owner.query('begin')
  await owner.query('select set_config(\'app.firm_id\', $1, true)', [firm.id])
  await owner.query(
    'insert into firm (id, name, address, telephone, email, country, scheme, registration, certificate_prefix, vat_number, settings) values ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10, $11)',
    [firm.id, firm.name, '4 Tannery Yard, Quillham, UX4 1QD', '01632 960040', firm.email, 'England', 'Invented Competent Person Scheme', 'DEMO-20417', 'QC', 'GB 999 9999 73', JSON.stringify(SETTINGS)],
  )
  await owner.query('commit')
}

const insertAll = (tx, table, firmId, rows) => tx.insert(table).values(rows.map(row => ({ firmId, ...row })))

/** Makes the firm; answers its ids and a context for each person. */
export async function makeFirm({ services, owner, clock, domain }) {
  const firm = { id: randomUUID(), name: 'Quillham Vehicle Charging Ltd', email: `office@${domain}` }
  await insertFirm(owner, firm)
  const passwordHash = await new Hash(new Scrypt(SCRYPT)).make(DEMO_PASSWORD)
  const crews = [{ id: randomUUID(), name: 'Crew A', position: 0 }, { id: randomUUID(), name: 'Crew B', position: 1 }]
  const people = PEOPLE.map(each => ({ ...each, id: randomUUID(), email: `${each.mailbox}@${domain}`, crewId: crews.find(crew => crew.name === each.crew)?.id ?? null }))
  const instruments = INSTRUMENTS.map(each => ({ ...each, id: randomUUID() }))
  await services.changeAsFirm(firm.id, async (tx) => {
    await insertAll(tx, services.crew, firm.id, crews)
    await insertAll(tx, services.person, firm.id, people.map(({ id, name, email, telephone }) => ({ id, name, email, telephone, passwordHash })))
    await insertAll(tx, services.membership, firm.id, people.map(({ id, roles, crewId }) => ({ personId: id, roles, crewId })))
    await insertAll(tx, services.qualification, firm.id, people.flatMap(({ id, qualifications }) => qualifications.map(({ lasts_days, ...rest }) => ({ id: randomUUID(), personId: id, ...rest, validTo: lasts_days === undefined ? null : clock.date(lasts_days) }))))
    await insertAll(tx, services.instrument, firm.id, instruments.map(({ id, name, description, serial, functions }) => ({ id, name, description, serial, functions })))
    await insertAll(tx, services.calibration, firm.id, instruments.flatMap(({ id, calibrated }) => calibrated.map(([done, until, reference]) => ({ id: randomUUID(), instrumentId: id, doneOn: clock.date(done), goodUntil: clock.date(until), reference }))))
    await insertAll(tx, services.priceItem, firm.id, PRICES.map(([code, description, unit, netPence]) => ({ id: randomUUID(), code, description, unit, netPence })))
    await insertAll(tx, services.retentionRule, firm.id, RETENTION.map(([subject, years, ground]) => ({ subject, years, ground, since: clock.date(-700) })))
    const { publicKeyPem, encryptedPrivateKey } = services.makeSealKey(services.config().keySecret)
    await insertAll(tx, services.sealKey, firm.id, [{ id: randomUUID(), publicKey: publicKeyPem, encryptedPrivateKey }])
    await services.recordEvent(tx, { type: 'settings-changed', personId: people.find(each => each.key === 'principal').id, detail: { firm: 'made' } })
  })
  const contextOf = ({ id, name, email, roles, crewId }) => services.firmContext(firm.id, { id, name, email, roles, firmId: firm.id, firmName: firm.name, selfCountersign: SETTINGS.selfCountersign, crewId })
  return {
    ...firm,
    crews: { A: crews[0], B: crews[1] },
    instruments: Object.fromEntries(instruments.map(each => [each.key, each])),
    people: Object.fromEntries(people.map(each => [each.key, contextOf(each)])),
  }
}
