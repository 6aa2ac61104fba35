import { LIMITER_60 } from '../designs.data.mjs'
import { acceptQuote, sendQuote, skipQuote } from '../money.mjs'
import { answerSurvey, designCircuit } from '../steps.mjs'

/** Designed and booked: tomorrow, this week, and later in the month. */
export async function installBooked(acts) {
  const book = async (name, { survey, demand, design, limiter, isQuoted = false, offset, half, crew }) => {
    const job = acts.job(name)
    await answerSurvey(acts, job, { survey, demand, crew, daysAgo: job.since - 6 })
    await designCircuit(acts, job, design, { daysAgo: job.since - 7, limiter })
    if (isQuoted) await acceptQuote(acts, job, await sendQuote(acts, job, design))
    else await skipQuote(acts, job)
    await acts.book(job, 'install', offset, half, crew)
    job.changed = Math.max(job.since - 9, 1)
  }
  await book('bookedTomorrow', { survey: 'pme80', demand: 'modest', design: 'shortTwin', isQuoted: true, offset: 1, half: 'am', crew: 'A' })
  await book('bungalow', { survey: 'bungalowTT', demand: 'small', design: 'bungalowTT', offset: 3, half: 'am', crew: 'B' })
  await book('limitedBooked', { survey: 'pme60', demand: 'busy', design: 'armoured', limiter: LIMITER_60, offset: 6, half: 'am', crew: 'A' })
  await book('laterBooked', { survey: 'pme80', demand: 'low', design: 'armoured', offset: 13, half: 'pm', crew: 'B' })
}
