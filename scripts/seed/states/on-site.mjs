import { LIMITER_60 } from '../designs.data.mjs'
import { HOMES } from '../homes.data.mjs'
import { answerSurvey, designCircuit, withMpan } from '../steps.mjs'
import { figuresOf, fit, inspectAndState, putBack, readDead, readLive, readSupply } from '../work.mjs'

const WORKER = { A: 'installer', B: 'grace' }

/** Brings a job to its site: surveyed, designed, booked for the day given and fitted. */
async function start(acts, name, { since, survey = 'pme80', demand = 'modest', design, limiter, daysAgo, half = 'am', crew = 'A', serial }) {
  const job = await acts.enquire(name, withMpan(HOMES[name], acts.services), since)
  await answerSurvey(acts, job, { survey, demand, crew, daysAgo: since - 5 })
  await designCircuit(acts, job, design, { daysAgo: since - 6, limiter })
  const visit = await acts.book(job, 'install', -daysAgo, half, crew)
  const at = time => acts.clock.at(-daysAgo, time)
  const who = WORKER[crew]
  await fit(acts, who, job, design, { at: at('09:40'), serial, limiter: limiter !== undefined })
  job.changed = daysAgo
  return { job, who, at, visit }
}

/** All tests, put-backs, inspections and the statement: nothing left but what the state keeps back. */
async function finish(acts, { job, who, at, visit }, figures, { limiter = false, sentences = {} } = {}) {
  await readSupply(acts, who, job, figures, at('10:30'))
  await readDead(acts, who, job, figures, at('11:00'))
  await putBack(acts, who, job, at('11:40'), 'energising')
  await readLive(acts, who, job, figures, at('12:10'), { limiter })
  await putBack(acts, who, job, at('13:10'), 'sign-off')
  for (const [test, sentence] of Object.entries(sentences)) await acts.change(who, job, 'unexpected', test, { sentence }, { at: at('13:15') })
  await inspectAndState(acts, who, job, at('13:20'), { limiter })
  await acts.closeVisit(visit)
}

/** Jobs whose work has begun: under way today, finished but unsigned, and three that something stops. */
export async function onSite(acts) {
  const ready = await start(acts, 'readyToSign', { since: 30, design: 'shortTwin', daysAgo: 1, serial: 'FL7-004182' })
  await finish(acts, ready, figuresOf('shortTwin'))

  const managed = await start(acts, 'limiterOnSite', { since: 29, survey: 'pme60', demand: 'busy', design: 'armoured', limiter: LIMITER_60, daysAgo: 2, crew: 'B', serial: 'FL7-004170' })
  await finish(acts, managed, figuresOf('armoured'), { limiter: true })

  // A joint at the isolator: the loop is above what the device allows, a re-test on the same day no better.
  const outside = await start(acts, 'loopOutside', { since: 27, design: 'armoured', daysAgo: 3, crew: 'B', serial: 'FL7-003995' })
  await finish(acts, outside, figuresOf('armoured', { Zs: '1.21' }))
  await acts.read(outside.who, outside.job, 'Zs', '1.18', { at: outside.at('13:45'), context: { ambient_C: 12, cause: 'connection' } })
  await acts.book(outside.job, 'return', 2, 'pm', 'B', { hours: 2, note: 'Open the isolator and remake the joint' })

  // Within its limit, yet more than twice what the cable should give.
  const odd = await start(acts, 'unexpected', { since: 26, design: 'shortTwin', daysAgo: 4, serial: 'FL7-003871' })
  await finish(acts, odd, figuresOf('shortTwin', { 'R1R2': '0.34', 'R1Rn': '0.19', 'Zs': '0.55' }))

  // A sheet from the van, typed by the office and half confirmed by the measurer.
  const sheet = await start(acts, 'paperSheet', { since: 24, design: 'shortTwin', daysAgo: 2, half: 'pm', serial: 'FL7-004055' })
  await readSupply(acts, sheet.who, sheet.job, figuresOf('shortTwin'), sheet.at('13:30'))
  for (const [test, typed] of [['R1R2', '0.15'], ['IR-live-earth', '>200'], ['IR-neutral-earth', '>200'], ['IR-line-neutral', '>200']]) {
    const id = await acts.read('office', sheet.job, test, typed, { at: sheet.at('14:40'), measuredBy: 'installer' })
    if (test === 'R1R2') await acts.confirmReading('installer', sheet.job, id)
  }

  // Under way this morning: half of the dead tests taken.
  const today = await start(acts, 'deadTests', { since: 21, design: 'shortTwin', daysAgo: 0, serial: 'FL7-004201' })
  const figures = figuresOf('shortTwin')
  await readSupply(acts, today.who, today.job, figures, today.at('10:10'))
  await acts.read(today.who, today.job, 'R1R2', '0.14', { at: today.at('10:30'), context: { ambient_C: 12 } })
  await acts.read(today.who, today.job, 'IR-live-earth', '>999', { at: today.at('10:36') })
}
