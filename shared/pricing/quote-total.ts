import { invoice, type VatRow } from './invoice'
import { shareOf } from '../utils/money'

export interface TotalLine { description: string, quantityThousandths: number, unitNetPence: number, vatBp: number }

export interface QuoteTotal { lineNetPence: number[], rates: VatRow[], netPence: number, vatPence: number, grossPence: number, depositPence: number }

/** What lines come to, by the invoice's own arithmetic; the deposit is its share of the price with VAT, to the nearest penny. */
export function quoteTotal(lines: readonly TotalLine[], vatRegistered: boolean, depositBp: number): QuoteTotal {
  if (!lines.length) return { lineNetPence: [], rates: [], netPence: 0, vatPence: 0, grossPence: 0, depositPence: 0 }
  const { result } = invoice({
    lines: lines.map(line => ({ description: line.description, quantity: line.quantityThousandths / 1000, unitNet_pence: line.unitNetPence, vat_bp: line.vatBp })),
    vatRegistered,
  })
  const grossPence = result.gross_pence ?? 0
  return {
    lineNetPence: result.line_net_pence ?? [],
    rates: result.rates ?? [],
    netPence: result.net_pence ?? 0,
    vatPence: result.vat_pence ?? 0,
    grossPence,
    depositPence: Math.max(0, shareOf(grossPence, depositBp, 10_000)),
  }
}
