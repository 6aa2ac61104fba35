/** Who may do what: one table that hides on the page and refuses on the server. */
import type { Role } from '../types/firm'

/** `own`: only on jobs whose visits the person's crew is on. */
type Reach = 'any' | 'own'

export const ACTS = {
  'read-jobs': { office: 'any', installer: 'any', supervisor: 'any', principal: 'any' },
  'change-enquiry': { office: 'any', principal: 'any' },
  'book-visits': { office: 'any', principal: 'any' },
  'answer-survey': { office: 'any', installer: 'own', supervisor: 'any' },
  'take-photographs': { office: 'any', installer: 'own', supervisor: 'any' },
  'draft-design': { office: 'any', installer: 'own', supervisor: 'any' },
  'record-work': { installer: 'own', supervisor: 'own' },
  'take-readings': { installer: 'own', supervisor: 'own' },
  'transcribe-readings': { office: 'any', installer: 'own', supervisor: 'any' },
  'sign-capacities': { installer: 'own', supervisor: 'own' },
  'send-back': { supervisor: 'any' },
  'countersign': { supervisor: 'any' },
  'revise-certificate': { supervisor: 'any' },
  'send-quotes': { office: 'any', principal: 'any' },
  'send-notices': { office: 'any', principal: 'any' },
  'send-packs': { office: 'any', principal: 'any' },
  'read-money': { office: 'any', installer: 'any', supervisor: 'any', principal: 'any' },
  'change-instruments': { office: 'any', supervisor: 'any', principal: 'any' },
  'confirm-tables': { supervisor: 'any' },
  'manage-people': { principal: 'any' },
  'change-prices': { principal: 'any' },
  'change-settings': { principal: 'any' },
  'use-calculations': { office: 'any', installer: 'any', supervisor: 'any', principal: 'any' },
} as const satisfies Record<string, Partial<Record<Role, Reach>>>

export type Act = keyof typeof ACTS

export interface Actor { id: string, roles: readonly Role[] }

/** Whether the person may do the act at all, and how far: on any job, on their own only, or not. */
export function reachOf(actor: Actor, act: Act): Reach | null {
  const row: Partial<Record<Role, Reach>> = ACTS[act]
  const reaches = actor.roles.map(role => row[role]).filter(reach => reach !== undefined)
  return reaches.includes('any') ? 'any' : reaches.includes('own') ? 'own' : null
}

/** Whether the person may do the act on a job; `isOwn` says whether they are on one of its visits. */
export function mayDo(actor: Actor, act: Act, isOwn = false): boolean {
  const reach = reachOf(actor, act)
  return reach === 'any' || (reach === 'own' && isOwn)
}

const ROLE_WORDS: Record<Role, string> = { office: 'the office', installer: 'an installer on the job', supervisor: 'a supervisor', principal: 'the principal' }

/** Who may do it, in words, for a lock that says why. */
export function whoMay(act: Act): string {
  const words = (Object.keys(ACTS[act]) as Role[]).map(role => ROLE_WORDS[role])
  return words.length > 1 ? `${words.slice(0, -1).join(', ')} or ${words.at(-1)}` : words[0] ?? 'nobody'
}
