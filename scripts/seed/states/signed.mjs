import { randomUUID } from 'node:crypto'
import { LIMITER_60 } from '../designs.data.mjs'
import { acceptQuote, sendQuote } from '../money.mjs'
import { finishWork, startWork } from '../site.mjs'
import { figuresOf } from '../work.mjs'

const ALL = ['designer', 'constructor', 'inspector']

async function sign({ services, firm }, { job, who }) {
  const ctx = firm.people[who]
  await services.signCapacities(ctx, job.id, { mutationId: randomUUID(), capacities: ALL, name: ctx.person.name, way: 'typed', declared: true })
}

async function countersign({ services, firm }, { job }) {
  const ctx = firm.people.supervisor
  await services.countersignJob(ctx, job.id, { mutationId: randomUUID(), name: ctx.person.name, declared: true, opened: ['R1R2', 'Zs'] }, services.config().keySecret)
}

const sendPack = ({ services, firm }, { job }) => services.sendPack(firm.people.office, job.id, { mutationId: randomUUID() })

async function tell(acts, { job, who }, kind, { how, daysAgo, reference }) {
  const { services, firm, clock } = acts
  const { notices } = await acts.record(job, who)
  await services.markNoticeSent(firm.people.office, notices.find(notice => notice.kind === kind).id, { mutationId: randomUUID(), sentOn: clock.date(-daysAgo), how, reference })
}

/** Three certificates, sealed in the order of the work; two of their packs are on their way. */
export async function sealed(acts) {
  const handed = await startWork(acts, 'handedOver', { design: 'armoured', daysAgo: 14, crew: 'B', serial: 'FL7-003411', between: async job => acceptQuote(acts, job, await sendQuote(acts, job, 'armoured')) })
  await finishWork(acts, handed, figuresOf('armoured', { 'RCD-time': '19' }))
  await acts.change('grace', handed.job, 'handover', 'handover', { shown: ['switch-off', 'first-charge', 'rcd-button', 'schedule', 'whom-to-call'], received_by: 'Edwin Castle' }, { at: handed.at('14:00') })
  await sign(acts, handed)
  await countersign(acts, handed)
  await sendPack(acts, handed)
  await tell(acts, handed, 'network-operator', { how: 'portal', daysAgo: 11, reference: 'NOT-55120' })
  await tell(acts, handed, 'building-control', { how: 'portal', daysAgo: 11, reference: 'BC-20931' })

  const promised = await startWork(acts, 'promised', { survey: 'pme60', demand: 'busy', design: 'armoured', limiter: LIMITER_60, daysAgo: 12, serial: 'FL7-003502' })
  await finishWork(acts, promised, figuresOf('armoured'), { limiter: true })
  await sign(acts, promised)
  await countersign(acts, promised)
  await acts.change('office', promised.job, 'promise', 'raise-limit', { what: 'raise-limit', trigger: 'The network operator has fitted an 80 A fuse', due_on: acts.clock.date(45), state: 'open', note: 'Asked for with the notice.' })
  await sendPack(acts, promised)

  const last = await startWork(acts, 'countersigned', { design: 'shortTwin', daysAgo: 6, serial: 'FL7-003790' })
  await finishWork(acts, last, figuresOf('shortTwin', { Ze: '0.23', Ipf: '1.07', Zs: '0.39' }))
  await sign(acts, last)
  await countersign(acts, last)
}

/** Signed and with the supervisor: one sent back with remarks, one with an Unexpected explained, one plain. */
export async function withSupervisor(acts) {
  const back = await startWork(acts, 'sentBack', { design: 'armoured', daysAgo: 5, crew: 'B', serial: 'FL7-003844' })
  await finishWork(acts, back, figuresOf('armoured'))
  await sign(acts, back)
  await acts.services.sendBack(acts.firm.people.supervisor, back.job.id, { mutationId: randomUUID(), queries: [{ part: 'equipment', field: 'height_m', question: 'The picture shows the charger lower than 1 m. Please measure again.' }, { part: 'inspection', field: '11', question: 'Which label is on the isolator?' }] }, acts.services.config().baseUrl)

  const odd = await startWork(acts, 'readyOdd', { design: 'shortTwin', daysAgo: 3, serial: 'FL7-004021' })
  await finishWork(acts, odd, figuresOf('shortTwin', { 'R1R2': '0.21', 'R1Rn': '0.13', 'Zs': '0.42' }), { sentences: { 'R1R2': 'The run had to go round the chimney breast; the cable marks show 13 m, the drum was remeasured at 19 m.', 'R1Rn': 'As R1+R2: the run is longer than drawn.' } })
  await sign(acts, odd)

  const plain = await startWork(acts, 'readyPlain', { design: 'armoured', daysAgo: 2, crew: 'B', serial: 'FL7-004102' })
  await finishWork(acts, plain, figuresOf('armoured'))
  await sign(acts, plain)
}
