/** A job's day on site, from the survey before it to the last answer. */
import { answerSurvey, designCircuit } from './steps.mjs'
import { fit, inspectAndState, putBack, readDead, readLive, readSupply } from './work.mjs'

const WORKER = { A: 'installer', B: 'grace' }

/** Brings a job to its site: surveyed, designed, booked for the day given and fitted. `between` is what the office does before it books. */
export async function startWork(acts, name, { between, survey = 'pme80', demand = 'modest', design, limiter, daysAgo, half = 'am', crew = 'A', serial }) {
  const job = acts.job(name)
  await answerSurvey(acts, job, { survey, demand, crew, daysAgo: job.since - 5 })
  await designCircuit(acts, job, design, { daysAgo: job.since - 6, limiter })
  await between?.(job)
  const visit = await acts.book(job, 'install', -daysAgo, half, crew)
  const at = time => acts.clock.at(-daysAgo, time)
  const who = WORKER[crew]
  await fit(acts, who, job, design, { at: at('09:40'), serial, limiter: limiter !== undefined })
  job.changed = daysAgo
  return { job, who, at, visit }
}

/** All tests, put-backs, inspections and the statement: nothing left but what the state keeps back. */
export async function finishWork(acts, { job, who, at, visit }, figures, { limiter = false, sentences = {} } = {}) {
  await readSupply(acts, who, job, figures, at('10:30'))
  await readDead(acts, who, job, figures, at('11:00'))
  await putBack(acts, who, job, at('11:40'), 'energising')
  await readLive(acts, who, job, figures, at('12:10'), { limiter })
  await putBack(acts, who, job, at('13:10'), 'sign-off')
  for (const [test, sentence] of Object.entries(sentences)) await acts.change(who, job, 'unexpected', test, { sentence }, { at: at('13:15') })
  await inspectAndState(acts, who, job, at('13:20'), { limiter })
  await acts.closeVisit(visit)
}
