/** A table of the trade as data: its figures, where they were read and how well they are known. */
import type { Confidence } from '../../utils/answer'

export interface TableSource {
  title: string
  edition: string
  url?: string
  more_urls?: readonly string[]
  /** Cells known better than the table as a whole: label, then column, then row keys. */
  seen_cells?: Partial<Record<Confidence, Readonly<Record<string, readonly (number | string)[]>>>>
}

export interface ReferenceTable<Row = Readonly<Record<string, unknown>>> {
  id: string
  title: string
  source: TableSource
  /** The weakest label of any cell, unless `seen_cells` says better of one. */
  confidence: Confidence
  units: Readonly<Record<string, string>>
  rows: readonly Row[]
  notes: string
  /** How the figures were checked against a law of physics, where they were. */
  checked?: string
}

/** How well one cell is known: better than its table where it was seen in print. */
export function cellConfidence(table: ReferenceTable, column: string, rowKey: number | string): Confidence {
  const seen = table.source.seen_cells
  if (seen?.['two sources']?.[column]?.includes(rowKey)) return 'two sources'
  if (seen?.['one source']?.[column]?.includes(rowKey)) return 'one source'
  return table.confidence
}
