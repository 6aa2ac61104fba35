import { describe, expect, it } from 'vitest'
import { formatAmps, formatBesideLimit, formatFigure, formatNumber, formatOhms, formatPercent, formatSquareMillimetres } from '#shared/utils/figures'

describe('figures', () => {
  it.each([
    [1.365625, 'Ω', 2, '1.37\u2009Ω'], [0.35, 'Ω', undefined, '0.35\u2009Ω'], [-0.5, 'V', 1, '\u22120.5\u2009V'], [32, 'A', undefined, '32\u2009A'],
    [1 / 3, 'A', undefined, '0.333\u2009A'], [5, '', 0, '5'],
  ])('%d %s to %s places', (value, unit, decimals, text) => {
    expect(formatFigure(value, unit, decimals)).toBe(text)
  })

  it('knows no minus zero and no NaN', () => {
    expect([formatNumber(-0.001, 2), formatNumber(-0), formatNumber(Number.NaN), formatNumber(Number.POSITIVE_INFINITY)]).toEqual(['0.00', '0', '–', '–'])
  })

  it('never writes a figure as the limit it is not', () => {
    expect(formatBesideLimit(11.52, 11.5, 'V', 1)).toBe('11.52\u2009V')
    expect(formatBesideLimit(11.5, 11.5, 'V', 1)).toBe('11.5\u2009V')
    expect(formatBesideLimit(11.4, 11.5, 'V', 1)).toBe('11.4\u2009V')
    expect(formatBesideLimit(60.0001, 60, 'A', 1)).toBe('60.0001\u2009A')
  })

  it('has the usual places for each unit', () => {
    expect([formatOhms(0.576584), formatAmps(32), formatPercent(1.828), formatSquareMillimetres(2.5)])
      .toEqual(['0.58\u2009Ω', '32.0\u2009A', '1.8\u2009%', '2.5\u2009mm²'])
  })
})
