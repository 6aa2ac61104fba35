/** The sizes conductors are made in, mm². @source IEC 60228 */
const STANDARD_MM2 = [1, 1.5, 2.5, 4, 6, 10, 16, 25, 35, 50, 70, 95, 120, 150, 185, 240, 300] as const

/** The smallest size made that is not below the one required, or null above 300 mm². */
export function nextStandardSize(required_mm2: number): number | null {
  return STANDARD_MM2.find(size => size >= required_mm2 - 1e-9) ?? null
}
