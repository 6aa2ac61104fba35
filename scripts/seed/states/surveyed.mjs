import { HOMES } from '../homes.data.mjs'
import { LIMITER_60 } from '../designs.data.mjs'
import { answerSurvey, designCircuit, withMpan } from '../steps.mjs'

/** Surveys answered, one for each way that a supply can turn out. */
export async function surveyed(acts) {
  const survey = async (name, since, answers) => {
    const job = await acts.enquire(name, withMpan(HOMES[name], acts.services), since)
    await answerSurvey(acts, job, answers)
    return job
  }
  const fits = await survey('fitsWell', 12, { survey: 'pme80', demand: 'modest', daysAgo: 6 })
  await designCircuit(acts, fits, 'shortTwin', { daysAgo: 5 })

  const small = await survey('smallFuse', 11, { survey: 'pme60', demand: 'busy', daysAgo: 5, crew: 'B' })
  await designCircuit(acts, small, 'armoured', { daysAgo: 4, limiter: LIMITER_60 })

  const ask = await survey('askFirst', 16, { survey: 'pme100', demand: 'gasHeated', daysAgo: 9 })
  await designCircuit(acts, ask, 'buried', { daysAgo: 8 })

  await survey('looped', 10, { survey: 'looped', demand: 'withShower', daysAgo: 3 })

  const unsafe = await survey('unsafeService', 9, { survey: 'unsafe', demand: 'gasHeated', daysAgo: 2, crew: 'B' })
  await acts.changeJob(unsafe, { sideState: 'waiting', sideNote: 'The network operator: unsafe cut-out, reported on 105' })

  // Ready for a quote each.
  const quote = await survey('wantsQuote', 15, { survey: 'pme80', demand: 'low', daysAgo: 8 })
  await designCircuit(acts, quote, 'armoured', { daysAgo: 7 })
}
