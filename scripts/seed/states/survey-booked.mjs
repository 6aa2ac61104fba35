import { HOMES } from '../homes.data.mjs'
import { withMpan } from '../steps.mjs'

/** Three surveys to come: today, soon and next week. */
export async function surveyBooked(acts) {
  const take = async (name, since, offset, half, crew) => {
    const job = await acts.enquire(name, withMpan(HOMES[name], acts.services), since)
    await acts.book(job, 'survey', offset, half, crew)
    job.changed = Math.max(since - 1, 0)
  }
  await take('surveyToday', 5, 0, 'pm', 'A')
  await take('surveySoon', 4, 2, 'am', 'B')
  await take('surveyNextWeek', 3, 7, 'pm', 'A')
}
