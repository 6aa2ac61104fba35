/** Counts failed sign-ins per account and per address in the database, so that a restart forgets nothing. */
import { createHash } from 'node:crypto'
import { RateLimiterPostgres, type RateLimiterRes } from 'rate-limiter-flexible'
import { problem } from '../../../shared/utils/problem'
import { databasePool } from '../../db/pool'

const WINDOW_S = 15 * 60

const limiter = (prefix: string, points: number) => new RateLimiterPostgres({ storeClient: databasePool(), tableName: 'rate_limit', tableCreated: true, clearExpiredByTimeout: false, keyPrefix: prefix, points, duration: WINDOW_S, blockDuration: WINDOW_S })
let limiters: { account: RateLimiterPostgres, address: RateLimiterPostgres } | undefined
const both = () => limiters ??= { account: limiter('account', 10), address: limiter('address', 50) }
const keyed = (text: string) => createHash('sha256').update(text.toLowerCase()).digest('base64url').slice(0, 32)

/** @throws 429 where the account or the address has failed too often */
export async function assertMayTry(email: string, address: string): Promise<void> {
  const { account, address: byAddress } = both()
  const held = await Promise.all([account.get(keyed(email)), byAddress.get(keyed(address))])
  if (isSpent(held[0], 10) || isSpent(held[1], 50)) throw problem('too-many', 'Too many tries with a wrong password. Wait 15 minutes, or set a new password by e-mail.')
}

const isSpent = (held: RateLimiterRes | null, points: number) => held !== null && held.consumedPoints >= points && held.msBeforeNext > 0

export async function countFailure(email: string, address: string): Promise<void> {
  const { account, address: byAddress } = both()
  await Promise.allSettled([account.consume(keyed(email)), byAddress.consume(keyed(address))])
}

export async function forgetFailures(email: string): Promise<void> {
  await both().account.delete(keyed(email))
}
