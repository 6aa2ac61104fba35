import { acceptQuote, sendQuote } from '../money.mjs'
import { answerSurvey, designCircuit } from '../steps.mjs'

/** One quote that waits for its customer, and one that was accepted and waits to be booked. */
export async function money(acts) {
  const quoted = async (name, answers, design) => {
    const job = acts.job(name)
    await answerSurvey(acts, job, { ...answers, daysAgo: job.since - 6 })
    await designCircuit(acts, job, design, { daysAgo: job.since - 7 })
    job.changed = job.since - 8
    return { job, quoteId: await sendQuote(acts, job, design) }
  }
  const accepted = await quoted('hasAccepted', { survey: 'pme80', demand: 'modest', crew: 'B' }, 'shortTwin')
  await acceptQuote(acts, accepted.job, accepted.quoteId)
  await quoted('wantsQuote', { survey: 'pme80', demand: 'low' }, 'armoured')
}
