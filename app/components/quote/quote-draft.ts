/** A quote while it is typed: everything is text until it is sent, so that nothing typed is lost or bent. */
import type { SuggestedLine } from '#shared/pricing/quote-lines'
import type { PriceItem, QuoteLineForm } from '#shared/schemas/quote'
import type { QuoteLineRow } from '#shared/types/record'

export interface DraftLine { key: string, description: string, quantity: string, unit: string, price: string, vatBp: number, why: string }

/** "1,450.5" -> 145050; NaN where it does not read as pounds and pence, or is empty. */
export function penceOf(text: string): number {
  const bare = text.replace(/[£,\s]/g, '').replace('\u2212', '-')
  const parts = /^(-?)(\d{1,9})(?:\.(\d{1,2}))?$/.exec(bare)
  return parts ? (parts[1] ? -1 : 1) * (Number(parts[2]) * 100 + Number((parts[3] ?? '').padEnd(2, '0'))) : Number.NaN
}

/** "7.5" -> 7500; NaN where it does not read as a quantity of at most three decimals. */
export function thousandthsOf(text: string): number {
  const parts = /^(\d{1,6})(?:\.(\d{1,3}))?$/.exec(text.replace(/[,\s]/g, ''))
  return parts ? Number(parts[1]) * 1000 + Number((parts[2] ?? '').padEnd(3, '0')) : Number.NaN
}

export const poundsText = (pence: number) => `${pence < 0 ? '-' : ''}${Math.floor(Math.abs(pence) / 100)}.${String(Math.abs(pence) % 100).padStart(2, '0')}`
export const quantityText = (thousandths: number) => String(thousandths / 1000)

let made = 0
const key = () => `line-${++made}`

export const fromSuggestion = (line: SuggestedLine): DraftLine => ({ key: key(), description: line.description, quantity: quantityText(line.quantityThousandths), unit: line.unit, price: line.unitNetPence === null ? '' : poundsText(line.unitNetPence), vatBp: line.vatBp, why: line.why })
export const fromPrice = (item: PriceItem): DraftLine => ({ key: key(), description: item.description, quantity: '1', unit: item.unit, price: poundsText(item.netPence), vatBp: item.vatBp, why: '' })
export const fromSent = (line: QuoteLineRow): DraftLine => ({ key: key(), description: line.description, quantity: quantityText(line.quantityThousandths), unit: line.unit, price: poundsText(line.unitNetPence), vatBp: line.vatBp, why: '' })
export const emptyLine = (vatBp: number): DraftLine => ({ key: key(), description: '', quantity: '1', unit: 'each', price: '', vatBp, why: '' })

export const toForm = (line: DraftLine): QuoteLineForm => ({ description: line.description, quantityThousandths: thousandthsOf(line.quantity), unit: line.unit, unitNetPence: penceOf(line.price), vatBp: line.vatBp })

/** Whether the line adds up yet; the total shown meanwhile is of those that do. */
export const isReckoned = (line: DraftLine) => Number.isFinite(thousandthsOf(line.quantity)) && Number.isFinite(penceOf(line.price))
