import { problem } from '../../../shared/utils/problem'
import { lookUp } from '../../db/firm-db'
import { startSession } from '../session'
import { inTurn } from './password-work'
import { assertMayTry, countFailure, forgetFailures } from './sign-in-guard'

/** The hashing functions are Nitro's; they come in as arguments so that this file loads without it. */
export interface PasswordHashing {
  verify(hash: string, password: string): Promise<boolean>
  hash(password: string): Promise<string>
}

let unknownAccountHash: Promise<string> | undefined

/**
 * Checks the password and starts a session; gives the secret for the cookie.
 * An unknown account costs the same hash and gets the same answer as a wrong password.
 */
export async function signIn(input: { email: string, password: string, address: string, userAgent: string }, hashing: PasswordHashing): Promise<string> {
  await assertMayTry(input.email, input.address)
  const [account] = await lookUp<{ firm_id: string, person_id: string, password_hash: string | null }>('find-sign-in', 'select * from find_sign_in($1)', [input.email])
  unknownAccountHash ??= inTurn(() => hashing.hash('nobody has this password'))
  const hash = account?.password_hash ?? await unknownAccountHash
  const fits = await inTurn(() => hashing.verify(hash, input.password))
  if (!account?.password_hash || !fits) {
    await countFailure(input.email, input.address)
    throw problem('check-answers', 'That e-mail address and password do not fit together. Check both, or set a new password.', { fields: { password: 'E-mail address and password do not fit together' } })
  }
  await forgetFailures(input.email)
  return startSession(account.firm_id, account.person_id, input.userAgent)
}
