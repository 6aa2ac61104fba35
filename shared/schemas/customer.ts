/** What customers send from their pages, and what those pages show: never more than the link's own subject. */
import * as z from 'zod'
import type { Verdict } from '../utils/verdict'

const id = z.uuid('Give the id its sender made')
const words = (what: string) => z.string(what).trim().min(1, what).max(4000, 'Use at most 4,000 characters')

export const acceptQuoteForm = z.strictObject({
  mutationId: id,
  version: z.int().min(1),
  /** That the terms were read and are agreed to. */
  agreed: z.literal(true, 'Read the terms and tick the box to agree to them'),
  /** The express request to begin inside the time for cancelling (rule COM-02). */
  startEarly: z.boolean().default(false),
  name: z.string('Type your full name').trim().min(2, 'Type your full name').max(120, 'Use at most 120 characters'),
})
export type AcceptQuote = z.infer<typeof acceptQuoteForm>

export const declineQuoteForm = z.strictObject({ mutationId: id, reason: words('Tell the firm why, in a few words') })
export type DeclineQuote = z.infer<typeof declineQuoteForm>

export const askForm = z.strictObject({ mutationId: id, /** The line or part it is about, in its own words. */ about: z.string().trim().max(300).default(''), question: words('Write your question') })
export type Ask = z.infer<typeof askForm>

export const customerActForm = z.strictObject({ mutationId: id })

export const postcodeForm = z.strictObject({ postcode: z.string('Enter the postcode of the address').trim().min(5, 'Enter the postcode of the address, such as SW1A 1AA').max(10, 'Enter the postcode of the address, such as SW1A 1AA') })

export interface CustomerQuoteLine { id: string, description: string, quantityThousandths: number, unit: string, unitNetPence: number, netPence: number, vatBp: number }

export type CustomerQuoteState = 'open' | 'run-out' | 'accepted' | 'deposit-received' | 'declined' | 'replaced'

export interface CustomerQuote {
  state: CustomerQuoteState
  firm: { name: string, telephone: string, email: string, address: string, vatNumber: string | null }
  customerName: string
  address: string
  number: string
  version: number
  expiresOn: string
  lines: CustomerQuoteLine[]
  rates: { vatBp: number, netPence: number, vatPence: number }[]
  netPence: number
  vatPence: number
  grossPence: number
  depositPence: number
  paidPence: number
  terms: string
  acceptedAt: string | null
  acceptedName: string | null
  /** Whether the deposit can be paid by card, now or right after accepting. */
  canPay: boolean
}

/** What came of a payment page, as far as the payment service has told us. */
export interface PaymentOutcome { state: 'waiting' | 'received' | 'unknown', firmName: string | null }

export const checkForm = z.union([
  z.strictObject({ id: z.uuid() }),
  z.strictObject({ sha256: z.string().regex(/^[0-9a-f]{64}$/) }),
  z.strictObject({ words: z.string().trim().min(3, 'Enter the four words from the foot of the certificate').max(120), number: z.string().trim().max(40).optional() }),
], 'Enter the four words, or choose the file')
export type CheckAsked = z.infer<typeof checkForm>

export type CheckOutcome
  = { state: 'not-ours' }
    | { state: 'which' }
    | { state: 'current' | 'replaced' | 'damaged', number: string, revision: number, kind: string, sealedOn: string, firmName: string, words: string, replacedBy: { number: string, revision: number, sealedOn: string } | null, checks: string[] }

export interface PackProofRow { checked: string, found: string, mustBe: string, inShort: string, verdict: Verdict | null, detail: string }
export interface PackAdvice { title: string, sentences: string[] }

export type CustomerPack
  = { state: 'locked', firmName: string }
    | {
      state: 'open'
      firmName: string
      firmTelephone: string
      address: string
      finishedOn: string
      certificate: string
      fourWords: string[]
      replacedBy: string | null
      advice: PackAdvice[]
      proof: PackProofRow[]
      told: string[]
      hasPdf: boolean
    }

export interface CustomerShots { firmName: string, firmTelephone: string, address: string, slots: { claim: string, label: string, visible: string, held: number }[] }

export interface CustomerVisit { firmName: string, firmTelephone: string, address: string, kind: string, day: string, half: string, state: string }
