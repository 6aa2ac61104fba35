import { problem } from '../../../shared/utils/problem'
import { findAddressee } from '../../db/queries/quotes'
import { config } from '../../utils/config'
import { readByLink, type FoundLink } from './customer-links'
import { countDoorTry, DOOR_HOURS, doorCookieName, isDoorKey, makeDoorKey, samePostcode } from './pack-door'

/** Gives a cookie of the request by its name. */
export type Cookies = (name: string) => string | undefined

export const isDoorOpen = (link: FoundLink, cookies: Cookies) => isDoorKey(config().sessionPassword, link.linkId, cookies(doorCookieName(link.linkId)), Date.now())

/** The cookie that holds the pack's door open, as the handler sets it. */
export interface DoorCookie { name: string, value: string, options: { path: string, httpOnly: true, sameSite: 'lax', secure: boolean, maxAge: number } }

/** Opens the pack's door where the postcode is right. @throws check-answers beside the field where it is not */
export async function openDoor(link: FoundLink, postcode: string): Promise<DoorCookie> {
  await countDoorTry(link.linkId)
  const to = await readByLink(link, tx => findAddressee(tx, link.firmId, link.jobId))
  if (!samePostcode(postcode, to.postcode)) throw problem('check-answers', 'That is not the postcode of this pack.', { fields: { postcode: 'Enter the postcode of the address where the charging point is' } })
  return { name: doorCookieName(link.linkId), value: makeDoorKey(config().sessionPassword, link.linkId, Date.now()), options: { path: '/', httpOnly: true, sameSite: 'lax', secure: config().cookieSecure, maxAge: DOOR_HOURS * 3600 } }
}

/** @throws not-allowed while the door is shut */
export function assertDoorOpen(link: FoundLink, cookies: Cookies): void {
  if (!isDoorOpen(link, cookies)) throw problem('not-allowed', 'Enter the postcode on the pack’s page first.')
}
