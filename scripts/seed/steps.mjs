/** Steps that jobs of several states go through: survey answers, the house's demand, the design. */
import { APPLIANCES, RECORDED, SURVEYS } from './surveys.data.mjs'
import { DESIGNS } from './designs.data.mjs'
import { SURVEY_SHOTS } from './photographs.mjs'

async function answerDemand(acts, who, job, demand, at) {
  for (const [position, [key, fields]] of (APPLIANCES[demand] ?? []).entries()) await acts.change(who, job, 'appliance', key, fields, { at, position })
  if (RECORDED[demand]) await acts.change(who, job, 'recordedDemand', 'recorded', RECORDED[demand], { at })
}

/** Answers the whole survey on the day it was booked for, and closes that visit. */
export async function answerSurvey(acts, job, { survey, demand, crew = 'A', daysAgo, shots = SURVEY_SHOTS }) {
  const who = crew === 'A' ? 'installer' : 'grace'
  const visit = await acts.book(job, 'survey', -daysAgo, 'am', crew)
  const at = acts.clock.at(-daysAgo, '10:20')
  await acts.change(who, job, 'survey', 'survey', SURVEYS[survey], { at })
  await answerDemand(acts, who, job, demand, at)
  await acts.photograph(who, job, shots, at)
  await acts.closeVisit(visit)
  await acts.finishSurvey(job)
  job.changed = daysAgo
}

/** Draws the legs, chooses device, cable and earthing method. */
export async function designCircuit(acts, job, design, { daysAgo, limiter, who = 'office' }) {
  const { circuit, legs, earthing } = DESIGNS[design]
  const at = acts.clock.at(-daysAgo, '14:05')
  for (const [position, [key, fields]] of legs.entries()) await acts.change(who, job, 'leg', key, fields, { at, position })
  await acts.change(who, job, 'circuit', 'designed', circuit, { at })
  await acts.change(who, job, 'earthing', 'earthing', earthing, { at })
  await acts.change(who, job, 'loadLimit', 'limit', limiter ?? { state: 'none' }, { at })
  job.changed = daysAgo
}
