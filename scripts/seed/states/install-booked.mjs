import { HOMES } from '../homes.data.mjs'
import { LIMITER_60 } from '../designs.data.mjs'
import { answerSurvey, designCircuit, withMpan } from '../steps.mjs'

/** Designed and booked: tomorrow, this week, and later in the month. */
export async function installBooked(acts) {
  const book = async (name, { since, survey, demand, design, limiter, offset, half, crew }) => {
    const job = await acts.enquire(name, withMpan(HOMES[name], acts.services), since)
    await answerSurvey(acts, job, { survey, demand, crew, daysAgo: since - 6 })
    await designCircuit(acts, job, design, { daysAgo: since - 7, limiter })
    await acts.book(job, 'install', offset, half, crew)
    job.changed = Math.max(since - 9, 1)
  }
  await book('bookedTomorrow', { since: 20, survey: 'pme80', demand: 'modest', design: 'shortTwin', offset: 1, half: 'am', crew: 'A' })
  await book('bungalow', { since: 18, survey: 'bungalowTT', demand: 'small', design: 'bungalowTT', offset: 3, half: 'am', crew: 'B' })
  await book('limitedBooked', { since: 17, survey: 'pme60', demand: 'busy', design: 'armoured', limiter: LIMITER_60, offset: 6, half: 'am', crew: 'A' })
  await book('laterBooked', { since: 14, survey: 'pme80', demand: 'low', design: 'armoured', offset: 13, half: 'pm', crew: 'B' })
}
