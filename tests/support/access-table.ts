/**
 * Who may call which route, written down a second time on purpose: the product reads its own table, and this one must agree.
 * O office, I installer, S supervisor, P principal; a small letter means only on jobs that the person's crew visits.
 */
import { randomUUID } from 'node:crypto'
import type { ServedFirm } from './served-firm'

export interface AccessRow {
  /** Null: anyone, signed in or not. */
  may: string | null
  /** What a caller who is let in gets: a write is sent `{}` and refused as 422, having come as far as its body. */
  answers: number
  /** A body the route would take, to reach a look-up that comes after it. */
  body?: (firm: ServedFirm) => Record<string, unknown>
  /** Written after the path. */
  query?: string
  /** What an id that is not there gets, by parameter, where that is not 404. */
  missing?: Record<string, number>
  /** What nobody in particular gets, where that differs. */
  nobody?: number
  /** Calling it ends the session, so that a test of sessions calls it. */
  endsSession?: boolean
}

const act = () => ({ mutationId: randomUUID() })
const anyone = (answers: number, rest: Partial<AccessRow> = {}): AccessRow => ({ may: null, answers, ...rest })
const reads = (may: string, rest: Partial<AccessRow> = {}): AccessRow => ({ may, answers: 200, ...rest })
const writes = (may: string, body?: AccessRow['body'], rest: Partial<AccessRow> = {}): AccessRow => ({ may, answers: 422, ...(body && { body }), ...rest })

const ALL = 'OISP'
const OFFICE = 'OP'
const calibration = { doneOn: '2026-10-01', goodUntil: '2027-10-01', reference: '' }

/** No link opens with these, so every caller gets one and the same answer. */
const LINKS: Record<string, AccessRow> = {
  'GET /api/customer/quote/[token]': anyone(404),
  'GET /api/customer/quote/[token]/quote.pdf': anyone(404),
  'POST /api/customer/quote/[token]/accept': anyone(404, { body: () => ({ ...act(), version: 1, agreed: true, name: 'Ada Test' }) }),
  'POST /api/customer/quote/[token]/decline': anyone(404, { body: () => ({ ...act(), reason: 'Too dear' }) }),
  'POST /api/customer/quote/[token]/question': anyone(404, { body: () => ({ ...act(), question: 'When?' }) }),
  'POST /api/customer/quote/[token]/pay': anyone(404, { body: act }),
  'GET /api/customer/pack/[token]': anyone(404),
  'GET /api/customer/pack/[token]/pack.pdf': anyone(404),
  'POST /api/customer/pack/[token]/postcode': anyone(404, { body: () => ({ postcode: 'UX4 2AA' }) }),
  'POST /api/customer/pack/[token]/question': anyone(404, { body: () => ({ ...act(), question: 'Why?' }) }),
  'POST /api/customer/pack/[token]/fresh': anyone(200, { body: act }),
  'POST /c/pack/[token]/open': anyone(404),
  'GET /api/customer/photographs/[token]': anyone(404),
  'POST /api/customer/photographs/[token]/[claim]': anyone(404),
  'GET /api/customer/visit/[token]': anyone(404),
  'POST /api/customer/visit/[token]/question': anyone(404, { body: () => ({ ...act(), question: 'When?' }) }),
  'GET /api/customer/paid/[page]': anyone(200),
}

const OPEN: Record<string, AccessRow> = {
  'GET /api/health': anyone(200),
  'GET /api/me': anyone(200, { nobody: 204 }),
  'POST /api/auth/sign-in': anyone(422),
  'POST /api/auth/forgotten': anyone(422),
  'POST /api/auth/new-password': anyone(422),
  'POST /api/stripe/webhook': anyone(400),
  'POST /api/check/certificate': anyone(422),
  'GET /api/check/find': anyone(422),
}

const JOBS: Record<string, AccessRow> = {
  'GET /api/jobs': reads(ALL),
  'POST /api/jobs': writes(OFFICE),
  'GET /api/jobs/[jobId]/record': reads(ALL),
  'POST /api/jobs/[jobId]/photographs': writes('OiS'),
  'POST /api/jobs/[jobId]/sign': writes('is'),
  'POST /api/jobs/[jobId]/send-back': writes('S'),
  'POST /api/jobs/[jobId]/countersign': writes('S'),
  'POST /api/jobs/[jobId]/revise': writes('S'),
  'POST /api/jobs/[jobId]/draft': writes(ALL),
  'POST /api/jobs/[jobId]/send-pack': writes(OFFICE),
  'POST /api/mutations': writes(ALL),
  'GET /api/today': reads(ALL),
  'GET /api/diary': reads(ALL, { query: '?from=2026-12-01' }),
  'POST /api/visits': writes(OFFICE),
  'PATCH /api/visits/[visitId]': writes(OFFICE, () => ({ ...act(), baseVersion: 1, note: 'Ring first' })),
  'GET /api/photographs/[sha256]': reads(ALL),
  'GET /api/papers/[paperId]': reads(ALL, { answers: 503 }),
  'GET /api/notices': reads(ALL),
  'POST /api/notices/[noticeId]/sent': writes(OFFICE, () => ({ ...act(), how: 'portal', sentOn: '2026-11-20', reference: '' })),
  'POST /api/notices/[noticeId]/reply': writes(OFFICE, () => ({ ...act(), outcome: 'question', repliedOn: '2026-11-21' })),
  'POST /api/jobs/[jobId]/prepare-notice': writes(OFFICE),
  'POST /api/messages/[messageId]/send-again': writes(OFFICE, act),
}

const MONEY: Record<string, AccessRow> = {
  'GET /api/jobs/[jobId]/quotes': reads(ALL),
  'POST /api/jobs/[jobId]/quotes': writes(OFFICE),
  'GET /api/jobs/[jobId]/quotes/[quoteId]/quote.pdf': reads(ALL, { answers: 503, missing: { quoteId: 503 } }),
  'POST /api/jobs/[jobId]/quotes/[quoteId]/send-again': writes(OFFICE, act),
  'POST /api/jobs/[jobId]/quotes/[quoteId]/withdraw': writes(OFFICE, act),
  'POST /api/jobs/[jobId]/quotes/not-needed': writes(OFFICE),
  'POST /api/jobs/[jobId]/quotes/withdraw-link': writes(OFFICE),
  'POST /api/jobs/[jobId]/quotes/invoices': writes(OFFICE),
  'GET /api/jobs/[jobId]/quotes/invoices/[invoiceId]/invoice.pdf': reads(ALL, { answers: 503, missing: { invoiceId: 503 } }),
  'GET /api/quotes/owed': reads(ALL),
  'GET /api/prices': reads(ALL),
  'POST /api/prices': writes('P'),
}

const FIRM: Record<string, AccessRow> = {
  'POST /api/auth/sign-out': writes(ALL, undefined, { endsSession: true }),
  'POST /api/calculations/[name]': writes(ALL, undefined, { answers: 200 }),
  'GET /api/instruments': reads(ALL),
  'POST /api/instruments': writes('OSP'),
  'PATCH /api/instruments/[instrumentId]': writes('OSP', () => ({ ...act(), active: true })),
  'POST /api/instruments/[instrumentId]/calibrations': writes('OSP', () => ({ ...act(), ...calibration })),
  'GET /api/people': reads('P'),
  'POST /api/people': writes('P'),
  'PATCH /api/people/[personId]': writes('P', () => ({ ...act(), roles: ['office'] })),
  'POST /api/people/[personId]/qualifications': writes('P', () => ({ ...act(), title: 'Testing', capacities: ['inspector'] })),
  'POST /api/crews': writes('P'),
  'GET /api/firm': reads('P'),
  'PUT /api/firm': writes('P'),
}

export const ACCESS: Record<string, AccessRow> = { ...OPEN, ...LINKS, ...JOBS, ...MONEY, ...FIRM }

/** Parameters that name no row of a firm's. */
export const NO_ROW = new Set(['name', 'token', 'page', 'claim'])

/** Whether a letter of the row lets the role in, on a job of its crew's or on another. */
export function lets(row: AccessRow, role: string, isOwn: boolean): boolean {
  const letter = role[0]!.toUpperCase()
  return row.may === null || row.may.includes(letter) || (isOwn && row.may.includes(letter.toLowerCase()))
}
