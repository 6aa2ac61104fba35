import type { PasswordHashing } from '../services/people/sign-in'

export const passwordHashing: PasswordHashing = { verify: (hash, password) => verifyPassword(hash, password), hash: password => hashPassword(password) }
