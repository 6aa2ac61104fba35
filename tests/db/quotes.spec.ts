import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, it } from 'vitest'
import { changeAsFirm } from '#server/db/firm-db'
import { findJob } from '#server/db/queries/jobs'
import { findCustomerLink, findSpentLink } from '#server/services/links/customer-links'
import { readCustomerQuote } from '#server/services/quotes/customer-quote'
import { acceptQuote, askFirm, declineQuote } from '#server/services/quotes/customer-acts'
import { sendQuoteAgain, skipQuote, takeBackLink, withdrawQuote } from '#server/services/quotes/office-acts'
import { sendQuote } from '#server/services/quotes/send-quote'
import { issueInvoice } from '#server/services/invoices/issue-invoice'
import { inFirm, makeFirm, makeJob, type TestFirm } from '../support/build/firm'
import { countRows, makeLink, makeQuotableJob, makeSentQuote, messagesOf, quoteForm, today } from '../support/build/quote'
import { addDays } from '#shared/utils/dates'
import '../support/db-setup'

let firm: TestFirm
beforeAll(async () => {
  firm = await makeFirm()
})

const stageOf = async (jobId: string) => (await changeAsFirm(firm.id, tx => findJob(tx, firm.id, jobId)))!.stage
const acceptance = (rest: Record<string, unknown> = {}) => ({ mutationId: randomUUID(), version: 1, agreed: true as const, startEarly: false, name: 'Ada Test', ...rest })
const refusal = async (act: Promise<unknown>) => act.then(() => null, (error: { problem?: { code: string, message: string } }) => error.problem ?? null)

describe('sending a quote', () => {
  it('moves the job, queues one mail with a link still to be made, and keeps no token', async () => {
    const { jobId, quoteId, token } = await makeSentQuote(firm)
    expect(await stageOf(jobId)).toBe('quoted')
    const [mail] = await messagesOf(firm, jobId)
    expect(mail).toMatchObject({ message: 'quote-sent', recipient: 'ada@customer.example', content: { gross_pence: 90_000, deposit_pence: 22_500, needsLink: { kind: 'customer', purpose: 'quote', subjectId: quoteId, sentTo: 'ada@customer.example' } } })
    const held = await inFirm(firm.id, 'select token_hash from customer_link where token_hash = $1', [token])
    expect(held).toEqual([])
  })
  it('acts once for one id, and refuses the id for other content', async () => {
    const jobId = await makeQuotableJob(firm)
    const form = quoteForm()
    const first = await sendQuote(firm.people.office, jobId, form)
    expect(await sendQuote(firm.people.office, jobId, form)).toEqual(first)
    expect(await messagesOf(firm, jobId)).toHaveLength(1)
    expect(await refusal(sendQuote(firm.people.office, jobId, { ...form, terms: 'Other.' }))).toMatchObject({ code: 'check-answers' })
  })
  it('replaces the earlier quote and takes its link back', async () => {
    const { jobId, quoteId, token } = await makeSentQuote(firm)
    await sendQuote(firm.people.office, jobId, quoteForm())
    expect(await inFirm(firm.id, 'select state from quote where id = $1', [quoteId])).toEqual([{ state: 'replaced' }])
    expect(await refusal(findCustomerLink(token, 'quote'))).toMatchObject({ code: 'not-found' })
  })
  it('gives numbers without a gap, also where one sending fails', async () => {
    const own = await makeFirm()
    const [one, two] = [await makeQuotableJob(own), await makeQuotableJob(own)]
    expect((await sendQuote(own.people.office, one, quoteForm())).number).toBe('Q0001')
    expect(await refusal(sendQuote(own.people.office, two, quoteForm({ expiresOn: addDays(today(), -1) })))).toMatchObject({ code: 'check-answers', fields: { expiresOn: expect.any(String) } })
    expect((await sendQuote(own.people.office, two, quoteForm())).number).toBe('Q0002')
  })
  it('is refused without an address to send to, and where it comes to nothing', async () => {
    expect(await refusal(sendQuote(firm.people.office, await makeJob(firm), quoteForm()))).toMatchObject({ code: 'check-answers' })
    const free = quoteForm({ lines: [{ description: 'Nothing', quantityThousandths: 1000, unit: 'each', unitNetPence: 0, vatBp: 0 }] })
    expect(await refusal(sendQuote(firm.people.office, await makeQuotableJob(firm), free))).toMatchObject({ fields: { lines: expect.any(String) } })
  })
  it('can be skipped: the job is accepted without one', async () => {
    const jobId = await makeJob(firm)
    expect(await skipQuote(firm.people.office, jobId, randomUUID())).toEqual({ stage: 'accepted' })
    expect(await refusal(skipQuote(firm.people.office, jobId, randomUUID()))).toMatchObject({ code: 'wrong-stage' })
  })
})

describe('a customer’s link', () => {
  it('opens its own purpose only; wrong, other, withdrawn and run out are answered alike', async () => {
    const { jobId, quoteId, token, link } = await makeSentQuote(firm)
    expect(link).toMatchObject({ firmId: firm.id, jobId, subjectId: quoteId, sentTo: 'ada@customer.example' })
    const spent = await makeLink(firm, jobId, 'quote', quoteId, 1)
    await inFirm(firm.id, 'update customer_link set expires_at = now() - interval \'1 second\' where id = $1', [(await findCustomerLink(spent, 'quote')).linkId])
    const withdrawn = await makeLink(firm, jobId, 'quote', quoteId)
    await takeBackLink(firm.people.office, jobId, { mutationId: randomUUID(), linkId: (await findCustomerLink(withdrawn, 'quote')).linkId })
    const answers = await Promise.all([
      refusal(findCustomerLink(token, 'pack')), refusal(findCustomerLink(spent, 'quote')), refusal(findCustomerLink(withdrawn, 'quote')),
      refusal(findCustomerLink(`${token.slice(0, -1)}${token.endsWith('A') ? 'B' : 'A'}`, 'quote')), refusal(findCustomerLink('', 'quote')), refusal(findCustomerLink('%00\' or 1=1', 'quote')),
    ])
    expect(answers[0]).toMatchObject({ code: 'not-found' })
    expect(answers.every(answer => JSON.stringify(answer) === JSON.stringify(answers[0]))).toBe(true)
    expect(await findSpentLink(spent, 'quote')).not.toBeNull()
    expect(await findSpentLink(withdrawn, 'quote')).toBeNull()
  })
  it('changes nothing by being read, however often', async () => {
    const { jobId, link, token } = await makeSentQuote(firm)
    const state = () => inFirm(firm.id, 'select j.record_version, j.changed_at, l.opened_at, q.version, q.state from job j join customer_link l on l.job_id = j.id join quote q on q.job_id = j.id where j.id = $1', [jobId])
    const before = await state()
    const events = await countRows(firm, 'audit_event')
    for (let times = 0; times < 20; times++) await readCustomerQuote(await findCustomerLink(token, 'quote'), true)
    expect(await state()).toEqual(before)
    expect(await countRows(firm, 'audit_event')).toBe(events)
    expect(await readCustomerQuote(link, true)).toMatchObject({ state: 'open', grossPence: 90_000, depositPence: 22_500, canPay: true })
  })
})

describe('accepting', () => {
  it('happens once, notes the use of the link and tells the firm', async () => {
    const { jobId, link } = await makeSentQuote(firm)
    const form = acceptance({ startEarly: true })
    const first = await acceptQuote(link, form)
    expect(first).toEqual({ state: 'accepted', depositPence: 22_500 })
    expect(await acceptQuote(link, form)).toEqual(first)
    expect(await refusal(acceptQuote(link, acceptance({ version: 2 })))).toMatchObject({ code: 'wrong-stage' })
    expect(await stageOf(jobId)).toBe('accepted')
    expect(await countRows(firm, 'audit_event', 'job_id = $1 and type = \'quote-accepted\'', [jobId])).toBe(1)
    expect(await countRows(firm, 'audit_event', 'job_id = $1 and type = \'link-opened\'', [jobId])).toBe(1)
    expect((await messagesOf(firm, jobId)).filter(mail => mail.message === 'customer-note')).toHaveLength(1)
    expect(await readCustomerQuote(link, true)).toMatchObject({ state: 'accepted', acceptedName: 'Ada Test' })
  })
  it('lets one of several at the same moment win', async () => {
    const { link } = await makeSentQuote(firm)
    const all = await Promise.all(Array.from({ length: 4 }, () => acceptQuote(link, acceptance()).then(() => 'accepted', () => 'refused')))
    expect(all.filter(each => each === 'accepted')).toHaveLength(1)
  })
  it('is refused after the last day, and the page says so', async () => {
    const { link, quoteId } = await makeSentQuote(firm)
    await inFirm(firm.id, 'update quote set expires_on = $2 where id = $1', [quoteId, addDays(today(), -1)])
    expect(await refusal(acceptQuote(link, acceptance()))).toMatchObject({ code: 'wrong-stage', message: expect.stringContaining('stood until') })
    expect((await readCustomerQuote(link, true)).state).toBe('run-out')
  })
  it('stands on the very version that was read', async () => {
    const { link } = await makeSentQuote(firm)
    expect(await refusal(acceptQuote(link, acceptance({ version: 9 })))).toMatchObject({ code: 'stale-copy' })
  })
  it('is refused after declining, and the reason reaches the firm', async () => {
    const { jobId, link } = await makeSentQuote(firm)
    await declineQuote(link, { mutationId: randomUUID(), reason: 'We are moving house' })
    expect(await refusal(acceptQuote(link, acceptance()))).toMatchObject({ code: 'wrong-stage' })
    expect((await messagesOf(firm, jobId)).at(-1)).toMatchObject({ message: 'customer-note', recipient: 'office@test.example', content: { sentences: [expect.any(String), 'We are moving house'] } })
  })
})

describe('what follows', () => {
  it('takes a question with the line it is about', async () => {
    const { jobId, link } = await makeSentQuote(firm)
    const form = { mutationId: randomUUID(), about: 'Charger fitted', question: 'Which colour?' }
    await askFirm(link, form)
    await askFirm(link, form)
    expect((await messagesOf(firm, jobId)).filter(mail => mail.message === 'customer-note')).toMatchObject([{ content: { sentences: ['About: Charger fitted', 'Which colour?', expect.any(String)] } }])
  })
  it('sends a fresh link while the quote stands, and ends the one before', async () => {
    const { jobId, quoteId, token } = await makeSentQuote(firm)
    expect(await sendQuoteAgain(firm.people.office, jobId, quoteId, randomUUID())).toEqual({ sentTo: 'ada@customer.example' })
    expect(await refusal(findCustomerLink(token, 'quote'))).toMatchObject({ code: 'not-found' })
    expect(await messagesOf(firm, jobId)).toHaveLength(2)
  })
  it('withdraws an accepted quote that was not paid, so that another can be sent', async () => {
    const { jobId, quoteId, link } = await makeSentQuote(firm)
    await acceptQuote(link, acceptance())
    expect(await refusal(sendQuote(firm.people.office, jobId, quoteForm()))).toMatchObject({ code: 'wrong-stage' })
    await withdrawQuote(firm.people.office, jobId, quoteId, randomUUID())
    expect((await sendQuote(firm.people.office, jobId, quoteForm())).number).toMatch(/^Q\d{4}$/)
  })
  it('invoices the balance only after handover, once, with its number and sums', async () => {
    const own = await makeFirm()
    const { jobId, link } = await makeSentQuote(own)
    await acceptQuote(link, acceptance())
    expect(await refusal(issueInvoice(own.people.office, jobId, randomUUID()))).toMatchObject({ code: 'wrong-stage' })
    await inFirm(own.id, 'update job set stage = \'handed-over\' where id = $1', [jobId])
    expect(await issueInvoice(own.people.office, jobId, randomUUID())).toMatchObject({ number: 'INV-0001', duePence: 90_000 })
    expect(await refusal(issueInvoice(own.people.office, jobId, randomUUID()))).toMatchObject({ code: 'wrong-stage' })
    const [{ content }] = await inFirm<{ content: Record<string, unknown> }>(own.id, 'select content from invoice where job_id = $1', [jobId]) as [{ content: Record<string, unknown> }]
    expect(content).toMatchObject({ number: 'INV-0001', gross_pence: 90_000, paid_pence: 0, firm: { name: 'Test Fitters Ltd', vatNumber: null }, customer: { name: 'Ada Test' }, lines: [{ net_pence: 90_000, vat_bp: 0 }] })
  })
})
