/** Of the enquiries one came to nothing and one waits for others; the rest wait for the office as they came. */
export async function enquiries(acts) {
  const cancelled = acts.job('cancelled')
  await acts.changeJob(cancelled, { sideState: 'cancelled', sideNote: 'Went with another firm' })
  cancelled.changed = 6
  const tenant = acts.job('tenantWaiting')
  await acts.change('office', tenant, 'consent', 'landlord', { kind: 'landlord', state: 'asked', by: 'Ropewalk Court Management', note: 'Letter sent by the customer' })
  await acts.changeJob(tenant, { sideState: 'waiting', sideNote: 'The landlord\'s permission' })
  tenant.changed = 7
}
