/** What is done on the day: what was fitted, the tests in meter order, and all that is put back. */
import { DESIGNS } from './designs.data.mjs'
import { LIMITER_SHOTS, WORK_SHOTS } from './photographs.mjs'

/** Readings of a sound job, by the length and size of its cable; what differs is given by the state that needs it. */
const ORDINARY = {
  shortTwin: { 'Ze': '0.18', 'Ipf': '1.36', 'R1R2': '0.14', 'R1Rn': '0.08', 'Zs': '0.35', 'Zs-board': '0.19', 'Ipf-board': '1.31' },
  armoured: { 'Ze': '0.21', 'Ipf': '1.22', 'R1R2': '0.11', 'R1Rn': '0.11', 'Zs': '0.34', 'Zs-board': '0.22', 'Ipf-board': '1.18' },
}

const DEAD = ['R1R2', 'R1Rn', 'IR-live-earth', 'IR-neutral-earth', 'IR-line-neutral', 'polarity']
const LIVE = ['Zs-board', 'Ipf-board', 'Zs', 'RCD-time', 'RCD-dc', 'RCD-button', 'vehicle-states', 'PE-fault', 'open-PEN', 'delay-restored', 'isolation']
const SAME = { 'supply-polarity': 'correct', 'IR-live-earth': '>999', 'IR-neutral-earth': '>999', 'IR-line-neutral': '>999', 'polarity': 'correct', 'RCD-time': '24', 'RCD-dc': '0.8', 'RCD-button': 'correct', 'vehicle-states': 'correct', 'PE-fault': 'correct', 'open-PEN': 'correct', 'limiter': 'correct', 'delay-restored': 'correct', 'isolation': 'correct' }

const minutesAfter = (moment, minutes) => new Date(Date.parse(moment) + minutes * 60_000).toISOString()

async function readAll(acts, who, job, tests, values, from, rest = {}) {
  let minute = 0
  for (const test of tests) {
    const at = minutesAfter(from, minute)
    await acts.read(who, job, test, values[test], { at: at > acts.clock.now ? acts.clock.now : at, context: /^(R1|Zs|Ze)/.test(test) ? { ambient_C: 12 } : {}, ...rest })
    minute += 4
  }
}

/** The figures of one job: ordinary ones for its design, then those that make its situation. */
export const figuresOf = (design, special = {}) => ({ ...SAME, ...ORDINARY[design], ...special })

export const readSupply = (acts, who, job, figures, at, rest) => readAll(acts, who, job, ['supply-polarity', 'Ze', 'Ipf'], figures, at, rest)
export const readDead = (acts, who, job, figures, at, rest) => readAll(acts, who, job, DEAD, figures, at, rest)
export const readLive = (acts, who, job, figures, at, { limiter = false, ...rest } = {}) => readAll(acts, who, job, limiter ? [...LIVE, 'limiter'] : LIVE, figures, at, rest)

/** The charger, the isolator, the cable as it was really run. */
export async function fit(acts, who, job, design, { at, serial, limiter = false }) {
  const { circuit, legs } = DESIGNS[design]
  const length = legs.reduce((sum, [, leg]) => sum + leg.L_m, 0)
  await acts.change(who, job, 'equipment', 'charger', { description: 'Wall charger, 7.4 kW, single-phase', standard: 'BS EN IEC 61851-1', rating_A: 32, serial, serial_again: serial, firmware: '4.2.1', location: 'Side wall beside the drive', height_m: 1, labels: 'yes' }, { at })
  await acts.change(who, job, 'equipment', 'isolator', { description: 'Double-pole isolator', standard: 'BS EN 60947-3', rating_A: 40, location: 'Beside the charger', labels: 'yes' }, { at })
  await acts.change(who, job, 'circuit', 'installed', { ...circuit, L_m: length, start_mark_m: 214, end_mark_m: 214 + length }, { at })
  if (limiter) await acts.change(who, job, 'loadLimit', 'limit', { state: 'fitted', set_A: 60, set_where: 'app', ct_checked: 'yes', fails_safe: 'yes', seen: 'Kettle, oven and hob on: the charge fell to 9 A and came back.' }, { at })
}

/** Ticks off what must be back in place before the act named, or all of it. */
export async function putBack(acts, who, job, at, before) {
  const record = await acts.record(job, who)
  for (const item of acts.services.putBackItems(record).filter(each => !before || each.before === before)) await acts.change(who, job, 'putBack', item.key, { done: 'yes' }, { at })
}

/** The schedule of inspections, as a job without odd parts answers it, and the statement of the work. */
export async function inspectAndState(acts, who, job, at, { limiter = false } = {}) {
  await acts.photograph(who, job, limiter ? [...WORK_SHOTS, ...LIMITER_SHOTS] : WORK_SHOTS, at)
  const absent = { 'no-other-sources': true, 'no-limiter': !limiter, 'no-open-PEN': false }
  for (const { key, notApplicableReason, notApplicableWhen } of acts.services.INSPECTIONS) {
    const isAbsent = notApplicableReason !== null && (notApplicableWhen === undefined || absent[notApplicableWhen])
    await acts.change(who, job, 'inspection', key, isAbsent ? { outcome: 'not-applicable', reason: notApplicableReason } : { outcome: 'satisfactory' }, { at })
  }
  await acts.change(who, job, 'statement', 'statement', { nature: 'addition', description: 'One new circuit from the main board to a vehicle charging point', not_covered: 'The rest of the installation', exceptions: 'None', next_inspection_years: 10, completed_on: at.slice(0, 10) }, { at })
}
