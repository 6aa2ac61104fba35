import type { H3Event } from 'h3'
import { getCookie, setCookie } from 'h3'
import { problem } from '../../shared/utils/problem'
import { findAddressee } from '../db/queries/quotes'
import { config } from './config'
import { readByLink, type FoundLink } from '../services/links/customer-links'
import { countDoorTry, DOOR_HOURS, doorCookieName, isDoorKey, makeDoorKey, samePostcode } from '../services/links/pack-door'

export const isDoorOpen = (event: H3Event, link: FoundLink) => isDoorKey(config().sessionPassword, link.linkId, getCookie(event, doorCookieName(link.linkId)), Date.now())

/** Opens the pack's door where the postcode is right. @throws check-answers beside the field where it is not */
export async function openDoor(event: H3Event, link: FoundLink, postcode: string): Promise<void> {
  await countDoorTry(link.linkId)
  const to = await readByLink(link, tx => findAddressee(tx, link.firmId, link.jobId))
  if (!samePostcode(postcode, to.postcode)) throw problem('check-answers', 'That is not the postcode of this pack.', { fields: { postcode: 'Enter the postcode of the address where the charging point is' } })
  setCookie(event, doorCookieName(link.linkId), makeDoorKey(config().sessionPassword, link.linkId, Date.now()), { path: '/', httpOnly: true, sameSite: 'lax', secure: config().cookieSecure, maxAge: DOOR_HOURS * 3600 })
}

/** @throws not-allowed while the door is shut */
export function assertDoorOpen(event: H3Event, link: FoundLink): void {
  if (!isDoorOpen(event, link)) throw problem('not-allowed', 'Enter the postcode on the pack’s page first.')
}
