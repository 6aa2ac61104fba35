import { describe, expect, it } from 'vitest'
import { table60228, tableI1, tableI2 } from '#shared/electrical/tables/conductors.data'
import { table4D1A, table4D2A, table4D4A, table4D5, table4E2A, table4E4A, table4F1A, table4F2A, table4F3A } from '#shared/electrical/tables/current-carrying.data'
import { referenceTables } from '#shared/electrical/tables/index.data'
import { table41_3_B, table41_3_C, table41_3_D } from '#shared/electrical/tables/loop-impedance.data'
import { tablePC1 } from '#shared/electrical/tables/profile-class-1.data'
import { tableK } from '#shared/electrical/tables/protective-conductors.data'
import { table4B1, table4B2 } from '#shared/electrical/tables/rating-factors.data'
import { cellConfidence } from '#shared/electrical/tables/reference-table'
import type { ReferenceTable } from '#shared/electrical/tables/reference-table'
import { table4D1B, table4D2B, table4D4B, table4E2B, table4E4B } from '#shared/electrical/tables/volt-drop.data'

const LABELS = ['two sources', 'one source', 'from memory', 'common practice', 'confirmed']

describe('reference tables', () => {
  it('are all 63 there, each under a name of its own', () => {
    expect(referenceTables).toHaveLength(63)
    expect(new Set(referenceTables.map(table => table.id)).size).toBe(63)
  })

  it.each(referenceTables.map(table => [table.id, table] as const))('%s says where it comes from and how well it is known', (_id, table) => {
    expect(table.title).not.toBe('')
    expect(table.source.title).not.toBe('')
    expect(table.source.edition).not.toBe('')
    expect(LABELS).toContain(table.confidence)
    expect(table.rows.length).toBeGreaterThan(0)
  })

  it('labels a cell seen in print better than its table', () => {
    expect(cellConfidence(table4D5, 'M100', 10)).toBe('two sources')
    expect(cellConfidence(table4D5, 'C', 6)).toBe('one source')
    expect(cellConfidence(table4D5, 'M102', 6)).toBe('from memory')
  })

  it('names only columns and rows that are there as seen in print', () => {
    for (const table of referenceTables) {
      for (const columns of Object.values(table.source.seen_cells ?? {})) {
        for (const [column, keys] of Object.entries(columns)) {
          const keyColumn = Object.keys(table.rows[0]!)[0]!
          for (const key of keys) expect(table.rows.find(row => row[keyColumn] === key)?.[column], `${table.id} ${column} ${key}`).toBeDefined()
        }
      }
    }
  })
})

describe('figures against laws that do not come from the tables', () => {
  it.each([table4D5, table4D1A, table4D2A, table4D4A, table4E2A, table4E4A, table4F1A, table4F2A, table4F3A].map(table => [table.id, table as ReferenceTable] as const))('%s never rates a larger size lower', (_id, table) => {
    for (const column of Object.keys(table.rows[0]!).filter(key => !['size_mm2', 'mV_per_A_m'].includes(key))) {
      const ratings = table.rows.map(row => row[column]).filter(cell => typeof cell === 'number')
      expect(ratings, column).toEqual([...ratings].sort((a, b) => a - b))
    }
  })

  const r20 = (size: unknown) => table60228.rows.find(row => row.size_mm2 === size)!.class1_2
  it.each([
    ['4D1B', table4D1B, 'C_1ph', 'C_3ph', 1.2], ['4D2B', table4D2B, 'one_phase', 'three_phase', 1.2], ['4D4B', table4D4B, 'one_phase', 'three_phase', 1.2],
    ['4E2B', table4E2B, 'one_phase', 'three_phase', 1.28], ['4E4B', table4E4B, 'one_phase', 'three_phase', 1.28],
  ] as const)('%s is the hot resistance of its conductors within 3.5 %%', (_id, table: ReferenceTable, one, three, hot) => {
    for (const row of table.rows) {
      const real = (cell: unknown) => typeof cell === 'number' ? cell : (cell as { r: number }).r
      expect(Math.abs(real(row[one]) / (2 * r20(row.size_mm2) * hot) - 1)).toBeLessThan(0.035)
      expect(Math.abs(real(row[three]) / (Math.sqrt(3) * r20(row.size_mm2) * hot) - 1)).toBeLessThan(0.035)
    }
  })

  it('4B1 follows its formula from 30 °C up, and prints less below', () => {
    for (const row of table4B1.rows) {
      for (const [column, most] of [['c60', 60], ['c70', 70], ['c90', 90]] as const) {
        const printed = row[column]
        if (printed === null) continue
        const byFormula = Math.sqrt((most - row.ambient_C) / (most - 30))
        if (row.ambient_C < 30) expect(printed).toBeLessThan(byFormula)
        else expect(Math.abs(printed - byFormula)).toBeLessThan(0.0066)
      }
    }
  })

  it('4B2 follows its formula', () => {
    for (const row of table4B2.rows) {
      if (row.c70 !== null) expect(Math.abs(row.c70 - Math.sqrt((70 - row.ground_C) / 50))).toBeLessThan(0.0066)
      expect(Math.abs(row.c90 - Math.sqrt((90 - row.ground_C) / 70))).toBeLessThan(0.0066)
    }
  })

  it('I1 is a sum of conductor resistances, I2 a line', () => {
    for (const row of tableI1.rows) expect(row.R1_R2).toBeCloseTo(r20(row.line_mm2) + (row.cpc_mm2 === null ? 0 : r20(row.cpc_mm2)), 9)
    for (const row of tableI2.rows) expect(row.factor).toBeCloseTo(1 + 0.004 * (row.ambient_C - 20), 9)
  })

  it.each([[table41_3_B, 5], [table41_3_C, 10], [table41_3_D, 20]] as const)('breaker limits are 0.95 × 230 V over their multiple', (table, multiple) => {
    for (const row of table.rows) expect(Math.abs(row.Zs_ohm - 218.5 / (multiple * row.In_A))).toBeLessThanOrEqual(0.00501)
  })

  it('k is near what material and temperatures give', () => {
    const MATERIAL = { copper: [234.5, 0.00345, 17.241e-6], aluminium: [228, 0.0025, 28.264e-6], steel: [202, 0.0038, 138e-6] } as const
    for (const row of tableK.rows) {
      const [beta, heat, rho] = MATERIAL[row.material as keyof typeof MATERIAL]
      const k = Math.sqrt(heat * (beta + 20) / rho * Math.log(1 + (row.t_final - row.t_initial) / (beta + row.t_initial)))
      expect(Math.abs(row.k / k - 1), `${row.material} ${row.use}`).toBeLessThan(0.015)
    }
  })

  it('the profile has 48 half-hours, and winter weekdays 12.29 kWh', () => {
    expect(tablePC1.rows).toHaveLength(48)
    expect(tablePC1.rows.reduce((sum, row) => sum + row.Wtr_Wd / 2, 0)).toBeCloseTo(12.29, 6)
  })
})
