/** Finding rows in the reference tables. */
import type { Cited } from './working'
import { cellConfidence } from './tables/reference-table'
import type { ReferenceTable } from './tables/reference-table'

export type Row = Readonly<Record<string, unknown>>

/** How a table is named on a sheet. */
export function tableName(table: ReferenceTable): string {
  return /^[0-9]/.test(table.id) && !/^60|^61/.test(table.id) && table.id !== '722' ? `Table ${table.id}` : table.title
}

export function cite(table: ReferenceTable, column: string, rowKey: number | string): Cited {
  return { source: tableName(table), confidence: cellConfidence(table, column, rowKey) }
}

/** The row whose key is exactly this. */
export function exactRow<R extends Row>(rows: readonly R[], key: keyof R, value: number): R | undefined {
  return rows.find(row => row[key] === value)
}

/** The first row whose key is not below this: the next hotter, longer, deeper or fuller one, which is the safe side. */
export function rowFrom<R extends Row>(rows: readonly R[], key: keyof R, value: number): R | undefined {
  return rows.find(row => (row[key] as number) >= value)
}

export function numberAt(row: Row | undefined, column: string): number | null {
  const cell = row?.[column]
  return typeof cell === 'number' ? cell : null
}
