/** Quotes from the price list, and the customer's answer through their own link. */
import { randomUUID } from 'node:crypto'
import { PRICES } from './firm.data.mjs'
import { DESIGNS } from './designs.data.mjs'

const THOUSAND = 1_000
const DAYS_OPEN = 45

/** What a design costs: codes of the price list with their quantities. */
function linesOf(design) {
  const { circuit, legs } = DESIGNS[design]
  const metres = legs.reduce((sum, [, leg]) => sum + leg.L_m, 0)
  const cable = circuit.cable === 'twin-earth-70' ? 'CABLE-6-TE' : 'CABLE-6-SWA'
  const wanted = [['CHARGER-7T', 1], ['RCBO-40', 1], ['ISOLATOR', 1], [cable, metres], ['LABOUR', 5]]
  return wanted.map(([code, quantity]) => {
    const [, description, unit, unitNetPence] = PRICES.find(([each]) => each === code)
    return { description, quantityThousandths: quantity * THOUSAND, unit, unitNetPence, vatBp: 2_000 }
  })
}

/** The office sends a quote; its mail waits in the outbox for the worker. Gives the quote's id. */
export async function sendQuote({ services, firm, clock }, job, design) {
  const { id } = await services.sendQuote(firm.people.office, job.id, { mutationId: randomUUID(), lines: linesOf(design), expiresOn: clock.date(30), terms: services.defaultTerms(firm.name) })
  return id
}

/** The customer accepts through a link of the kind that the mail carries. */
export async function acceptQuote({ services, firm }, job, quoteId) {
  const { name, email } = job.customer
  const token = await services.changeAsFirm(firm.id, tx => services.makeCustomerLink(tx, { firmId: firm.id, jobId: job.id, purpose: 'quote', subjectId: quoteId, sentTo: email, days: DAYS_OPEN }))
  const link = await services.findCustomerLink(token, 'quote')
  await services.acceptQuote(link, { mutationId: randomUUID(), version: 1, agreed: true, startEarly: true, name })
}

export const skipQuote = ({ services, firm }, job) => services.skipQuote(firm.people.office, job.id, randomUUID())
