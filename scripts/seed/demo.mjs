import { DEMO_DOMAIN } from '../demo-sign-ins.mjs'
import { demoActs } from './acts.mjs'
import { demoClock, seededRandom } from './clock.mjs'
import { makeFirm } from './firm.mjs'
import { HOMES } from './homes.data.mjs'
import { enquiries } from './states/enquiries.mjs'
import { installBooked } from './states/install-booked.mjs'
import { money } from './states/money.mjs'
import { onSite, readyToSign } from './states/on-site.mjs'
import { sealed, withSupervisor } from './states/signed.mjs'
import { surveyBooked } from './states/survey-booked.mjs'
import { surveyed } from './states/surveyed.mjs'

const RANDOM_SEED = 20_261_201

/** Each brings its own jobs to their state; they share no job, so they go on side by side. */
const STATES = [sealed, withSupervisor, readyToSign, onSite, installBooked, money, surveyed, surveyBooked, enquiries]

/**
 * Makes the invented firm and its jobs.
 * @param {{ services: object, owner: import('pg').ClientBase, now: string, domain?: string }} given `domain` ends the people's e-mail addresses
 */
export async function seedDemo({ services, owner, now, domain = DEMO_DOMAIN }) {
  const clock = demoClock(now, services)
  const firm = await makeFirm({ services, owner, clock, domain })
  const acts = demoActs({ services, firm, clock, random: seededRandom(RANDOM_SEED) })
  await acts.enquireAll(HOMES)
  await Promise.all(STATES.map(state => state(acts)))
  await acts.backdate()
  return { firm, jobs: acts.jobs.length, byName: Object.fromEntries(acts.jobs.map(job => [job.name, job])) }
}
