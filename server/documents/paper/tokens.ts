/** Measures of every paper, in points. */
export const MM = 72 / 25.4
export const MARGIN = 14 * MM
export const FOOT_HEIGHT = 13 * MM

export const PORTRAIT_WIDTH = 210 * MM - 2 * MARGIN
export const LANDSCAPE_WIDTH = 297 * MM - 2 * MARGIN

/** Body, table and note sizes; nothing on paper is smaller than a note. */
export const SIZE = { title: 21, section: 12, body: 10, table: 8.5, note: 7.5 } as const

/** Inter's own line is 1.21 of its size; 10 pt on a 14 pt line. */
export const BODY_LINE = 14 / (10 * 1.21)
export const TABLE_LINE = 1.05

/** Black, one grey for header cells, and plum for the one rule under the title. */
export const INK = '#000000'
export const GREY = '#e0e0e0'
export const PLUM = '#5b2a6e'
export const HAIRLINE = 0.3
