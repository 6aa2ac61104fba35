/** The supply's verdict as people say it on the doorstep. */
import type { SupplyResult } from '../electrical/supply'
import { formatAmps } from '../utils/figures'
import { LEAST_CHARGE_A } from '../electrical/least-charge'
import { listWords } from './judge/judged'
import type { Capacity, Judged } from './judge/types'

export const CAPACITY_WORDS: Record<Capacity['code'], string> = {
  'fits': 'Fits',
  'fits-if-managed': 'Fits if load-managed',
  'does-not-fit': 'Does not fit',
  'cannot-tell': 'Cannot tell yet',
}

/** Capacity in one word and one sentence, from the answer of the supply calculation. */
export function capacityOf({ answer, input, waitsFor }: Judged<SupplyResult>): Capacity {
  const code = codeOf(answer, input)
  return { code, words: CAPACITY_WORDS[code], sentence: sentenceOf(code, answer.result, input, listWords(waitsFor)) }
}

function codeOf({ verdict, missing, result }: Judged<SupplyResult>['answer'], input: Record<string, unknown>): Capacity['code'] {
  if (verdict === 'within') return input.limiterTested === true && result.limitNeeded ? 'fits-if-managed' : 'fits'
  if (verdict === 'outside') return 'does-not-fit'
  return missing.length === 1 && missing[0] === 'limiterTested' ? 'fits-if-managed' : 'cannot-tell'
}

function sentenceOf(code: Capacity['code'], result: Partial<SupplyResult>, input: Record<string, unknown>, waits: string): string {
  const fuse = typeof input.fuse_A === 'number' ? formatAmps(input.fuse_A, 0) : ''
  const { demandAfter_A, evAllowed_A, limitSetting_A } = result
  const left = evAllowed_A === undefined ? '' : evAllowed_A < LEAST_CHARGE_A ? 'charging pauses' : `the charger gets ${formatAmps(evAllowed_A)}`
  switch (code) {
    case 'fits': return `House and charger draw ${formatAmps(demandAfter_A!)} at most; the main fuse is ${fuse}.`
    case 'fits-if-managed': {
      const when = input.limiterTested === true ? 'The tested limiter' : 'Once the limiter is tested, it'
      return `${when} holds the demand to ${formatAmps(limitSetting_A!, 0)}; while the house draws its most, ${left}.`
    }
    case 'does-not-fit': {
      const house = input.house_A as number
      if (house > (input.fuse_A as number)) return `The house alone draws ${formatAmps(house)}, more than the main fuse of ${fuse}.`
      return `House and charger would draw ${formatAmps(demandAfter_A!)}, more than the main fuse of ${fuse}. With a load limiter at ${formatAmps(limitSetting_A!, 0)}, ${left} while the house draws its most.`
    }
    case 'cannot-tell': return waits ? `It needs ${waits}.` : 'It needs the main fuse, the house and the charger.'
    default: return code satisfies never
  }
}
