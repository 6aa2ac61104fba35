/** The rule of Table 54.7 as arithmetic. @source BS 7671 Table 54.7, as in tables/protective-conductors.data.ts */
import { shown } from './working'

export function tableProtectiveSizes(line_mm2: number): { size_mm2: number, expression: string } {
  if (line_mm2 <= 16) return { size_mm2: line_mm2, expression: `${shown(line_mm2)}, up to 16` }
  if (line_mm2 <= 35) return { size_mm2: 16, expression: `16, as ${shown(line_mm2)} is up to 35` }
  return { size_mm2: line_mm2 / 2, expression: `${shown(line_mm2)} ÷ 2` }
}
