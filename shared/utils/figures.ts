/**
 * How a figure is written on pages, papers and e-mails: rounded once, here; a thin space (U+2009) before the unit,
 * a true minus (U+2212), always a leading zero.
 */
const THIN_SPACE = '\u2009'
const MINUS = '\u2212'
const MOST_DECIMALS = 6
/** Without a stated number of decimals a figure keeps what it has, up to this many. */
const FREE_DECIMALS = 3

/** The number alone. @example (-0.5, 2) -> '−0.50' */
export function formatNumber(value: number, decimals?: number): string {
  if (!Number.isFinite(value)) return '–'
  const size = Math.abs(value)
  const text = decimals === undefined ? String(Number(size.toFixed(FREE_DECIMALS))) : size.toFixed(decimals)
  const isZero = Number(text) === 0
  return value < 0 && !isZero ? MINUS + text : text
}

/**
 * A number and its unit.
 * @param decimals fixed places; left out, up to three and no trailing zeros
 * @example (1.365625, 'Ω', 2) -> '1.37 Ω' with a thin space
 */
export function formatFigure(value: number, unit: string, decimals?: number): string {
  const number = formatNumber(value, decimals)
  return unit ? `${number}${THIN_SPACE}${unit}` : number
}

/**
 * A figure that stands beside its limit, with as many places as it takes for the two to read differently:
 * 11.52 V against 11.5 V is never written "11.5 V".
 */
export function formatBesideLimit(value: number, limit: number, unit: string, decimals: number): string {
  let places = decimals
  while (value !== limit && places < MOST_DECIMALS && Number(value.toFixed(places)) === Number(limit.toFixed(places))) places++
  return formatFigure(value, unit, places)
}

export const formatAmps = (value: number, decimals = 1) => formatFigure(value, 'A', decimals)
export const formatMilliamps = (value: number, decimals = 0) => formatFigure(value, 'mA', decimals)
export const formatKiloamps = (value: number, decimals = 2) => formatFigure(value, 'kA', decimals)
export const formatVolts = (value: number, decimals = 1) => formatFigure(value, 'V', decimals)
export const formatOhms = (value: number, decimals = 2) => formatFigure(value, 'Ω', decimals)
export const formatMegohms = (value: number, decimals = 2) => formatFigure(value, 'MΩ', decimals)
export const formatKilowatts = (value: number, decimals = 2) => formatFigure(value, 'kW', decimals)
export const formatKilowattHours = (value: number, decimals = 1) => formatFigure(value, 'kWh', decimals)
export const formatPercent = (value: number, decimals = 1) => formatFigure(value, '%', decimals)
export const formatMetres = (value: number, decimals?: number) => formatFigure(value, 'm', decimals)
export const formatSquareMillimetres = (value: number, decimals?: number) => formatFigure(value, 'mm²', decimals)
export const formatMilliseconds = (value: number, decimals = 0) => formatFigure(value, 'ms', decimals)
export const formatSeconds = (value: number, decimals?: number) => formatFigure(value, 's', decimals)
