import type { Judgement } from '../../../shared/job/judge/types'
import { checkMpan } from '../../../shared/job/rules/mpan'
import type { FieldValue } from '../../../shared/job/fields/field'
import type { Part } from '../../../shared/job/parts'
import type { JobRecord } from '../../../shared/types/record'
import { notApplicable, notEntered, textField, type PrintedField } from '../../../shared/schemas/sealed-record/field'
import { formatNumber } from '../../../shared/utils/figures'
import type { NoticeContent, NoticeRoute } from '../../documents/notice/content'
import type { firm } from '../../db/schema/firm'
import type { notice } from '../../db/schema/notice'

interface NoticeSource { record: JobRecord, judgement: Judgement, firm: typeof firm.$inferSelect, notice: typeof notice.$inferSelect }

const HOW_SHOWN: Record<string, string> = { read: 'read on it', told: 'told by the network operator', measured: 'measured', assumed: 'assumed' }

/** All that the network operator's sheet says, each figure with how it is known; what is not known says so. */
export function noticeContent({ record, judgement, firm: theFirm, notice: row }: NoticeSource): NoticeContent {
  const value = (part: Part, key: string, field: string): FieldValue => record.parts[part].find(each => each.key === key)?.content[field] ?? null
  const shown = (part: Part, key: string, field: string, unit?: string): PrintedField => {
    const held = value(part, key, field)
    if (held === null) return notEntered()
    const how = value(part, key, `${field}_how`)
    return textField(Array.isArray(held) ? held.join(', ') : String(held), { unit, howKnown: typeof how === 'string' ? HOW_SHOWN[how] : undefined })
  }
  const amps = (figure: number | null | undefined, how: string): PrintedField => figure === null || figure === undefined ? notEntered() : textField(formatNumber(figure, 1), { value: figure, unit: 'A', howKnown: how })
  const operator = checkMpan({ mpan: record.premises.mpan, country: record.premises.country }).result
  const { supply, route } = judgement
  const address = [record.premises.address, record.premises.town, record.premises.postcode].filter(Boolean).join(', ')
  const limiter = value('loadLimit', 'limit', 'state')
  return {
    reference: record.job.ref,
    at: row.madeAt.toISOString(),
    operatorName: String(operator.operator ?? 'The network operator of this supply'),
    route: row.route as NoticeRoute,
    reasons: row.reasons,
    conditions: route.answer.result.conditions ?? [],
    lastDay: row.lastDay,
    installedOn: typeof value('statement', 'statement', 'completed_on') === 'string' ? value('statement', 'statement', 'completed_on') as string : null,
    firm: { name: theFirm.name, address: theFirm.address, telephone: theFirm.telephone, email: theFirm.email, registration: [theFirm.scheme, theFirm.registration].filter(Boolean).join(' ') },
    customer: { name: record.customer.name, address, telephone: record.customer.telephone, email: record.customer.email },
    premises: { address, shortAddress: record.premises.address.split(',')[0] ?? address, country: record.premises.country, mpan: record.premises.mpan ? textField(record.premises.mpan) : notEntered(), region: String(operator.region ?? '') },
    demand: {
      before: amps(judgement.houseDemand.used_A, judgement.houseDemand.way === 'recorded' ? 'recorded' : 'by allowances'),
      after: amps(supply.answer.result.demandAfter_A, 'calculated'),
      vehicleLoad: amps(judgement.ev_A, 'full current of the charging point'),
      limiter: limiter === null || limiter === 'none' ? notApplicable('no load limiter') : textField(String(limiter)),
      limit: limiter === null || limiter === 'none' ? notApplicable('no load limiter') : shown('loadLimit', 'limit', value('loadLimit', 'limit', 'set_A') === null ? 'limit_A' : 'set_A', 'A'),
    },
    supply: {
      cutoutRating: shown('survey', 'survey', 'cutout_A', 'A'), phases: shown('survey', 'survey', 'supply_phases'), earthing: shown('survey', 'survey', 'earthing'),
      looped: shown('survey', 'survey', 'looped'), serviceCondition: shown('survey', 'survey', 'service_ok'), otherSources: shown('survey', 'survey', 'other_sources'),
    },
    device: {
      description: shown('equipment', 'charger', 'description'), rating: shown('wanted', 'wanted', 'rating_kW', 'kW'), phases: shown('wanted', 'wanted', 'phases'),
      standard: shown('equipment', 'charger', 'standard'), export: value('wanted', 'wanted', 'export_A') ? shown('wanted', 'wanted', 'export_A', 'A') : textField('none'), count: textField('1'),
    },
    declarations: ['The figures are those of the job\'s record on the day of this sheet.', 'The customer has asked us to tell the network operator.'],
    signedBy: theFirm.name,
    enclosed: record.photographs.some(each => each.claim === 'cutout-rating') ? ['Photograph of the cut-out'] : [],
  }
}
