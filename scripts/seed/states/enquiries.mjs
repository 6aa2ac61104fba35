import { HOMES } from '../homes.data.mjs'

/** Four enquiries that wait for the office or for others, and one that came to nothing. */
export async function enquiries(acts) {
  const cancelled = await acts.enquire('cancelled', HOMES.cancelled, 13)
  await acts.changeJob(cancelled, { sideState: 'cancelled', sideNote: 'Went with another firm' })
  cancelled.changed = 6
  const tenant = await acts.enquire('tenantWaiting', HOMES.tenantWaiting, 8)
  await acts.change('office', tenant, 'consent', 'landlord', { kind: 'landlord', state: 'asked', by: 'Ropewalk Court Management', note: 'Letter sent by the customer' })
  await acts.changeJob(tenant, { sideState: 'waiting', sideNote: 'The landlord\'s permission' })
  tenant.changed = 7
  await acts.enquire('longName', HOMES.longName, 4)
  await acts.enquire('noEmail', HOMES.noEmail, 2)
  await acts.enquire('newToday', HOMES.newToday, 0)
}
