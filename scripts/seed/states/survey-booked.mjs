/** Three surveys to come: today, soon and next week. */
export async function surveyBooked(acts) {
  const take = async (name, offset, half, crew) => {
    const job = acts.job(name)
    await acts.book(job, 'survey', offset, half, crew)
    job.changed = job.since - 1
  }
  await take('surveyToday', 0, 'pm', 'A')
  await take('surveySoon', 2, 'am', 'B')
  await take('surveyNextWeek', 7, 'pm', 'A')
}
