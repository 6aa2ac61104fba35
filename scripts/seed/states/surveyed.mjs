import { LIMITER_60 } from '../designs.data.mjs'
import { answerSurvey, designCircuit } from '../steps.mjs'

/** Surveys answered, one for each way that a supply can turn out. */
export async function surveyed(acts) {
  const survey = async (name, answers) => {
    const job = acts.job(name)
    await answerSurvey(acts, job, answers)
    return job
  }
  const fits = await survey('fitsWell', { survey: 'pme80', demand: 'modest', daysAgo: 6 })
  await designCircuit(acts, fits, 'shortTwin', { daysAgo: 5 })

  const small = await survey('smallFuse', { survey: 'pme60', demand: 'busy', daysAgo: 5, crew: 'B' })
  await designCircuit(acts, small, 'armoured', { daysAgo: 4, limiter: LIMITER_60 })

  const ask = await survey('askFirst', { survey: 'pme100', demand: 'gasHeated', daysAgo: 9 })
  await designCircuit(acts, ask, 'buried', { daysAgo: 8 })

  await survey('looped', { survey: 'looped', demand: 'withShower', daysAgo: 3 })

  const unsafe = await survey('unsafeService', { survey: 'unsafe', demand: 'gasHeated', daysAgo: 2, crew: 'B' })
  await acts.changeJob(unsafe, { sideState: 'waiting', sideNote: 'The network operator: unsafe cut-out, reported on 105' })
}
