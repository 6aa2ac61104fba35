/** The pack's door: the postcode is asked once, and a signed cookie holds it open for one link and some hours. */
import { createHmac, timingSafeEqual } from 'node:crypto'
import { RateLimiterPostgres } from 'rate-limiter-flexible'
import { problem } from '../../../shared/utils/problem'
import { databasePool } from '../../db/pool'

export const DOOR_HOURS = 12
const MOST_TRIES = 10
const WINDOW_S = 15 * 60

export const doorCookieName = (linkId: string) => `copperplate-pack-${linkId.slice(-12)}`

const signOf = (secret: string, text: string) => createHmac('sha256', createHmac('sha256', secret).update('copperplate pack door v1').digest()).update(text).digest('base64url')

/** What the cookie holds: until when, and a signature that ties it to this link. @param now milliseconds since 1970 */
export function makeDoorKey(secret: string, linkId: string, now: number): string {
  const until = now + DOOR_HOURS * 3_600_000
  return `${until}.${signOf(secret, `${linkId}.${until}`)}`
}

export function isDoorKey(secret: string, linkId: string, key: string | undefined, now: number): boolean {
  const [until, sign] = (key ?? '').split('.')
  if (!until || !sign || !/^\d{1,15}$/.test(until) || Number(until) <= now) return false
  const [given, right] = [Buffer.from(sign), Buffer.from(signOf(secret, `${linkId}.${until}`))]
  return given.length === right.length && timingSafeEqual(given, right)
}

/** Alike however it is typed: "sw1a1aa" and "SW1A 1AA". */
export const samePostcode = (a: string, b: string) => bare(a) !== '' && bare(a) === bare(b)
const bare = (postcode: string) => postcode.toUpperCase().replace(/[^A-Z0-9]/g, '')

let limiter: RateLimiterPostgres | undefined
const tries = () => limiter ??= new RateLimiterPostgres({ storeClient: databasePool(), tableName: 'rate_limit', tableCreated: true, clearExpiredByTimeout: false, keyPrefix: 'pack-door', points: MOST_TRIES, duration: WINDOW_S, blockDuration: WINDOW_S })

/** Counts one try at a link's postcode. @throws too-many after ten in a quarter of an hour */
export async function countDoorTry(linkId: string): Promise<void> {
  const held = await tries().consume(linkId).catch((refused: unknown) => {
    if (refused instanceof Error) throw refused
    return null
  })
  if (!held) throw problem('too-many', 'That is too many tries. Wait 15 minutes and try again.')
}
