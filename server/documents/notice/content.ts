import { formatDay, londonDay } from '#shared/utils/dates'
import { fact, sayText, textFact, type FactGroup } from '../paper/said'
import type { PrintedField } from '#shared/schemas/sealed-record/field'
import type { OpeningContent } from '../paper/opening'

export const ROUTES = ['tell-after', 'ask-first', 'contact', 'generation-application'] as const
export type NoticeRoute = (typeof ROUTES)[number]

interface Contact { name: string, address: string, telephone: string, email: string }

/** All that the network operator's sheet is made from. Figures come as printed fields, so that each says how it is known. */
export interface NoticeContent {
  reference: string
  /** The moment the sheet was drawn up. */
  at: string
  operatorName: string
  route: NoticeRoute
  /** Why this route, each beginning with its rule id. */
  reasons: string[]
  conditions: string[]
  /** The last day for this notice; null where nothing may be fitted before the answer. */
  lastDay: string | null
  /** Day of installation, or null where it is still to come. */
  installedOn: string | null
  firm: Contact & { registration: string }
  customer: Contact
  premises: { address: string, shortAddress: string, country: string, mpan: PrintedField, region: string }
  demand: { before: PrintedField, after: PrintedField, vehicleLoad: PrintedField, limiter: PrintedField, limit: PrintedField }
  supply: { cutoutRating: PrintedField, phases: PrintedField, earthing: PrintedField, looped: PrintedField, serviceCondition: PrintedField, otherSources: PrintedField }
  device: { description: PrintedField, rating: PrintedField, phases: PrintedField, standard: PrintedField, export: PrintedField, count: PrintedField }
  declarations: string[]
  signedBy: string
  /** What goes with it: photograph of the cut-out, working sheet … */
  enclosed: string[]
}

export interface NoticeWords { opening: OpeningContent, heading: FactGroup, reasons: string[], groups: FactGroup[], declarations: string[], enclosed: string[] }

const ROUTE_WORDS: Record<NoticeRoute, { title: string, what: string }> = {
  'tell-after': { title: 'Notice of a vehicle charging point', what: 'Told after the installation' },
  'ask-first': { title: 'Request to connect a vehicle charging point', what: 'Asked first: nothing is energised before your answer' },
  'contact': { title: 'Question about a supply', what: 'Contact before any work' },
  'generation-application': { title: 'Request to connect a charging point that can export', what: 'Asked first, with the generation forms: nothing is energised before your acceptance' },
}

/** The sheet in words and rows. */
export function noticeWords(notice: NoticeContent): NoticeWords {
  const route = ROUTE_WORDS[notice.route]
  return {
    opening: { over: notice.firm.name, title: route.title, under: `${notice.reference}  ·  ${notice.premises.shortAddress}  ·  drawn up ${formatDay(londonDay(notice.at))}`, qr: null, qrWords: null },
    heading: {
      title: 'This notice',
      facts: [
        textFact('To', notice.operatorName),
        textFact('Route', route.what),
        textFact('Last day', notice.lastDay ? formatDay(notice.lastDay) : 'None: work waits for your answer'),
        textFact('Installed on', notice.installedOn ? formatDay(notice.installedOn) : 'Not installed yet'),
      ],
    },
    reasons: [...notice.reasons, ...notice.conditions.map(one => `On condition: ${one}`)],
    groups: [peopleGroup(notice), demandGroup(notice), supplyGroup(notice), deviceGroup(notice)],
    declarations: [...notice.declarations, `Declared by ${notice.signedBy} for ${notice.firm.name}.`],
    enclosed: notice.enclosed.length ? notice.enclosed : ['Nothing.'],
  }
}

function peopleGroup({ customer, firm, premises }: NoticeContent): FactGroup {
  const contact = (who: Contact) => [who.address, `telephone ${who.telephone}`, who.email]
  return {
    title: 'Who and where',
    facts: [
      { label: 'Customer', said: sayText(customer.name, contact(customer)) },
      { label: 'Installer', said: sayText(firm.name, [...contact(firm), firm.registration]) },
      textFact('Premises', premises.address, [premises.country]),
      fact('Supply number (MPAN)', premises.mpan),
      textFact('Distribution region', premises.region),
    ],
  }
}

function demandGroup({ demand }: NoticeContent): FactGroup {
  return {
    title: 'Maximum demand',
    facts: [
      fact('Before this work', demand.before),
      fact('After this work', demand.after),
      fact('All vehicle charging, with what was there', demand.vehicleLoad),
      fact('Load limiter', demand.limiter),
      fact('Its limit', demand.limit),
    ],
  }
}

function supplyGroup({ supply }: NoticeContent): FactGroup {
  return {
    title: 'Supply',
    facts: [
      fact('Cut-out rating', supply.cutoutRating),
      fact('Phases', supply.phases),
      fact('Earthing finally used', supply.earthing),
      fact('Looped service', supply.looped),
      fact('Service equipment', supply.serviceCondition),
      fact('Other sources', supply.otherSources),
    ],
  }
}

function deviceGroup({ device }: NoticeContent): FactGroup {
  return {
    title: 'Charging point',
    facts: [
      fact('Device', device.description),
      fact('Rating', device.rating),
      fact('Phases', device.phases),
      fact('Emission standards', device.standard),
      fact('Can it export', device.export),
      fact('How many', device.count),
    ],
  }
}
