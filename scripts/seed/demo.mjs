import { DEMO_DOMAIN } from '../demo-sign-ins.mjs'
import { demoActs } from './acts.mjs'
import { demoClock, seededRandom } from './clock.mjs'
import { makeFirm } from './firm.mjs'
import { enquiries } from './states/enquiries.mjs'
import { installBooked } from './states/install-booked.mjs'
import { onSite } from './states/on-site.mjs'
import { surveyBooked } from './states/survey-booked.mjs'
import { surveyed } from './states/surveyed.mjs'

const RANDOM_SEED = 20_261_201

/** Each state's jobs, in the order in which their numbers are given out: the oldest work first. */
const STATES = [onSite, installBooked, surveyed, surveyBooked, enquiries]

/**
 * Makes the invented firm and its jobs.
 * @param {{ services: object, owner: import('pg').Client, now: string, domain?: string }} given `domain` ends the people's e-mail addresses
 */
export async function seedDemo({ services, owner, now, domain = DEMO_DOMAIN }) {
  const clock = demoClock(now, services)
  const firm = await makeFirm({ services, owner, clock, domain })
  const acts = demoActs({ services, firm, clock, random: seededRandom(RANDOM_SEED) })
  for (const state of STATES) await state(acts)
  await acts.backdate()
  return { firm, jobs: acts.jobs.length, byName: Object.fromEntries(acts.jobs.map(job => [job.name, job])) }
}
