import type { InvoiceContent } from '#server/documents/invoice/content'
import type { NoticeContent } from '#server/documents/notice/content'
import type { PackInput } from '#server/documents/pack/content'
import type { LiveWithItFacts } from '#server/documents/plain-words/live-with-it'
import type { QuoteContent } from '#server/documents/quote/content'
import { textField } from '#shared/schemas/sealed-record/field'
import { installationSample } from '../../support/build/sealed-record'

export const SEAL = { hash: '3f7a9c51e2'.padEnd(64, '7'), checkUrl: 'https://charge.example/c/WRN-2027-00042' }

export const LIVE_WITH: LiveWithItFacts = { isolatorWhere: 'the rotary switch beside the charging point', boardWhere: 'in the hall cupboard', boardWay: 'switch 9', firmName: 'Wrenfield Charging (invented)', firmTelephone: '01632 960123', networkTelephone: '105', loadLimit_A: 60, randomDelay_min: 10, guaranteeUntil: '2030-03-02' }

export const packSample = (changes: Partial<PackInput> = {}): PackInput => ({ record: installationSample(), seal: SEAL, liveWith: LIVE_WITH, auditHead: 'a'.repeat(64), photographs: [], told: ['The network operator was told on Thu 4 Mar 2027; last day Tue 30 Mar 2027.'], ...changes })

const firm = { name: 'Wrenfield Charging (invented)', address: 'Unit 2, Sample Yard, Exampleton ZZ9 9ZZ', telephone: '01632 960123', email: 'office@wrenfield.example', vatNumber: 'GB 000 0000 00', companyNumber: '00000000' }
const premises = { address: '19 Hill Street, Exampleton ZZ1 1ZZ', shortAddress: '19 Hill Street, ZZ1 1ZZ' }
const customer = { name: 'A. Sample', address: '19 Hill Street, Exampleton ZZ1 1ZZ' }

export const noticeSample = (changes: Partial<NoticeContent> = {}): NoticeContent => ({
  reference: 'WRN-N-2027-0007',
  at: '2027-03-04T09:00:00Z',
  operatorName: 'Network operator of region 14',
  route: 'tell-after',
  reasons: ['DNO-02: every condition for telling afterwards is met.', 'DNO-03: demand after the work is 60 A, not above 60 A.'],
  conditions: ['DNO-11: the load limiter fails safe, is declared here and was tested before charging.'],
  lastDay: '2027-03-30',
  installedOn: '2027-03-02',
  firm: { ...firm, registration: 'Invented Competence Scheme ICS 000123' },
  customer: { ...customer, telephone: '01632 960001', email: 'a.sample@home.example' },
  premises: { ...premises, country: 'England', region: '14', mpan: textField('14 0000 0000 000', { howKnown: 'read on site, check digit right' }) },
  demand: { before: textField('46', { unit: 'A', howKnown: 'calculated' }), after: textField('60', { unit: 'A', howKnown: 'calculated' }), vehicleLoad: textField('32', { unit: 'A' }), limiter: textField('Fitted and tested'), limit: textField('60', { unit: 'A', howKnown: 'set in the installer’s menu' }) },
  supply: { cutoutRating: textField('80', { unit: 'A', howKnown: 'read on the fuse carrier' }), phases: textField('1'), earthing: textField('TN-C-S'), looped: textField('No'), serviceCondition: textField('No concern seen'), otherSources: textField('None') },
  device: { description: textField('Vehicle charging point, socket type 2'), rating: textField('7.4', { unit: 'kW' }), phases: textField('1'), standard: textField('Declared by the maker'), export: textField('No'), count: textField('1') },
  declarations: ['The customer has agreed that we write to you for them.', 'The figures above are true as far as we know.'],
  signedBy: 'S. Fictional',
  enclosed: ['Photograph of the cut-out', 'Working of the maximum demand'],
  ...changes,
})

const money = {
  lines: [
    { description: 'Charging point, 7.4 kW, supplied and fitted', quantity: 1, unit: '', unitNet_pence: 64900, net_pence: 64900, vat_bp: 2000 },
    { description: 'Armoured cable, clipped', quantity: 18, unit: 'm', unitNet_pence: 950, net_pence: 17100, vat_bp: 2000 },
  ],
  rates: [{ vat_bp: 2000, net_pence: 82000, vat_pence: 16400 }],
  net_pence: 82000,
  vat_pence: 16400,
  gross_pence: 98400,
  grant_pence: 0,
}

export const quoteSample = (changes: Partial<QuoteContent> = {}): QuoteContent => ({
  number: 'WRN-Q-2027-0031', at: '2027-02-01T10:00:00Z', validUntil: '2027-03-03', firm, customer, premises, ...money,
  scope: 'One vehicle charging point on the garage wall, with its own circuit from the consumer unit in the hall',
  notIncluded: ['Making good of plaster and paint', 'Work that the network operator may ask for first'],
  deposit_pence: 20000,
  terms: ['You may cancel within 14 days without giving a reason.', 'Work inside the 14 days starts only if you ask for it in writing.'],
  acceptUrl: 'https://charge.example/q/abc123',
  ...changes,
})

export const invoiceSample = (changes: Partial<InvoiceContent> = {}): InvoiceContent => ({
  number: 'WRN-I-2027-0018', at: '2027-03-04T10:00:00Z', issued: '2027-03-04', taxPoint: '2027-03-02', dueBy: '2027-03-18', firm, customer, premises, ...money,
  paid_pence: 20000, due_pence: 78400, payUrl: 'https://charge.example/pay/abc123', corrects: null,
  ...changes,
})
