import { describe, expect, it } from 'vitest'
import { parseFigure, showFigure } from '../../../app/utils/parse-figure'

describe('reading a typed figure', () => {
  it.each([['0.35', 0.35], ['0,35', 0.35], ['.35', 0.35], ['0.35 ohm', 0.35], ['0.35Ω', 0.35], [' 32 A ', 32], ['6 mm²', 6], ['-5 °C', -5], ['\u22125', -5], ['7.', 7], ['0,350', 0.35], ['1234', 1234]])('%s is %d', (text, value) => {
    expect(parseFigure(text)).toEqual({ value })
  })

  it('reads nothing as nothing', () => {
    expect(parseFigure('  ')).toEqual({ value: null })
  })

  it.each(['0.3.5', '1,234.5', 'about 3', 'ohm', '.', '3-4'])('asks again about "%s"', (text) => {
    expect(parseFigure(text)).toHaveProperty('problem')
  })

  it('asks which is meant where a comma could be thousands', () => {
    expect(parseFigure('1,234')).toEqual({ problem: 'Type 1234 or 1.234: the comma could mean either.' })
  })
})

describe('showing it back', () => {
  it.each([[0.35, '0.35'], [-5, '\u22125'], [0.1 + 0.2, '0.3'], [32, '32']])('%d shows as %s', (value, text) => {
    expect(showFigure(value)).toBe(text)
  })
})
