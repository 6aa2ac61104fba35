import { mockNuxtImport, registerEndpoint } from '@nuxt/test-utils/runtime'
import { readBody } from 'h3'
import type { Mutation } from '#shared/job/mutations'
import type { Me } from '#shared/types/firm'
import type { JobRecord } from '#shared/types/record'
import { SUPERVISOR, TESTER, WORK_DAY } from '../../support/build/job-record'

mockNuxtImport('useJobId', () => () => 'j-1')

const person = (id: string, roles: Me['roles']): Me => ({ id, name: 'R. Invented', email: 'r@example.test', roles, firmId: 'f1', firmName: 'Larkfield Electrical', selfCountersign: false })
export const INSTALLER = person(TESTER, ['installer'])
export const CHECKER = person(SUPERVISOR, ['supervisor'])

let who = INSTALLER
registerEndpoint('/api/me', () => who)

/** Every change that a page sent, in order. */
export const sent: Mutation[] = []
registerEndpoint('/api/mutations', { method: 'POST', handler: async (event) => {
  const { items } = await readBody<{ items: Mutation[] }>(event)
  sent.push(...items)
  return { outcomes: items.map(item => ({ id: item.id, status: 'applied', recordVersion: 2 })) }
} })

/** Puts a record and a signed-in person before the components of job j-1. */
export function standOn(record: JobRecord, me: Me = INSTALLER): void {
  who = me
  sent.length = 0
  useState<Me | null>('me').value = me
  useState('today').value = WORK_DAY
  useJobRecords().records = { 'j-1': record }
}

export const buttonOf = (root: ParentNode, words: RegExp): HTMLButtonElement => {
  const found = [...root.querySelectorAll('button')].find(each => words.test(each.getAttribute('aria-label') ?? each.textContent?.trim() ?? ''))
  if (!found) throw new Error(`No button reads ${words}`)
  return found
}
