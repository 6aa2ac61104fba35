import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const css = readFileSync(new URL('../../../app/assets/css/tokens.css', import.meta.url), 'utf8')

/** The custom properties of the first rule whose selector list contains the text. */
function tokensOf(selector: string): Record<string, string> {
  const start = css.indexOf(selector)
  const body = css.slice(css.indexOf('{', start) + 1, css.indexOf('}', start))
  return Object.fromEntries([...body.matchAll(/--([a-z-]+):\s*([^;]+);/g)].map(([, name, value]) => [name, value]))
}

const light = tokensOf('html[data-theme=\'light\']')
const themes = {
  light,
  dark: { ...light, ...tokensOf('html[data-theme=\'dark\']') },
  sun: { ...light, ...tokensOf('html[data-theme=\'sun\']') },
}
type Theme = keyof typeof themes

/** WCAG 2.2 relative luminance of #RRGGBB. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map(at => Number.parseInt(hex.slice(at, at + 2), 16) / 255).map(c => c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4)
  return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!
}

function contrast(theme: Theme, over: string, under: string): number {
  const [a, b] = [themes[theme][over]!, themes[theme][under]!].map(luminance)
  return (Math.max(a!, b!) + 0.05) / (Math.min(a!, b!) + 0.05)
}

const text = [
  ['ink', 'paper'], ['ink', 'chalk'], ['slate', 'paper'], ['slate', 'chalk'], ['plum', 'paper'], ['plum', 'chalk'],
  ['plum-dark', 'plum-tint'], ['ink', 'plum-tint'], ['slate', 'plum-tint'], ['within', 'within-tint'], ['over', 'paper'], ['over', 'chalk'], ['over', 'over-tint'],
  ['brass', 'paper'], ['brass', 'brass-tint'], ['ink', 'brass-tint'], ['info', 'paper'], ['on-fill', 'plum'], ['on-fill', 'within'], ['on-fill', 'over'], ['on-fill', 'ink'],
]

describe.each(['light', 'dark', 'sun'] as Theme[])('contrast in the %s theme', (theme) => {
  it.each(text)('letters in %s on %s reach 4.5 to 1', (over, under) => {
    expect(contrast(theme, over, under)).toBeGreaterThanOrEqual(4.5)
  })

  it.each([['rule', 'paper'], ['rule', 'chalk'], ['ink', 'chalk'], ['halo', 'ink']])('edges in %s on %s reach 3 to 1', (over, under) => {
    // Where the lettering is itself light, the amber halo stands against the page instead of the ring.
    const against = theme === 'dark' && over === 'halo' ? 'chalk' : under
    expect(contrast(theme, over, against)).toBeGreaterThanOrEqual(3)
  })
})

describe('the figures the design rests on', () => {
  it.each([
    ['light', 'ink', 'paper', 16.52], ['light', 'ink', 'chalk', 14.76], ['light', 'slate', 'paper', 8.31], ['light', 'rule', 'chalk', 3.86], ['light', 'plum', 'chalk', 9.37],
    ['light', 'plum-dark', 'plum-tint', 11.72], ['light', 'brass', 'brass-tint', 6.3], ['light', 'within', 'within-tint', 7.36], ['light', 'over', 'over-tint', 6.71], ['light', 'halo', 'ink', 9.02],
    ['dark', 'ink', 'chalk', 15.9], ['dark', 'ink', 'paper', 13.7], ['dark', 'slate', 'paper', 7.9], ['dark', 'rule', 'paper', 4.6], ['dark', 'plum', 'paper', 8.6], ['dark', 'within', 'paper', 8.7],
    ['sun', 'ink', 'paper', 21], ['sun', 'over', 'paper', 11.5],
  ] as [Theme, string, string, number][])('%s: %s on %s is %d to 1', (theme, over, under, ratio) => {
    expect(Math.abs(contrast(theme, over, under) - ratio)).toBeLessThan(0.06)
  })

  it('keeps the halo too pale to stand alone on white, which is why the focus ring is ink first', () => {
    expect(contrast('light', 'halo', 'paper')).toBeLessThan(3)
  })

  it('gives who asks the system for contrast the same colours as the sun theme', () => {
    const asked = tokensOf('html:not([data-theme]) {')
    expect(asked).toEqual(tokensOf('html[data-theme=\'sun\']'))
  })

  it('gives paper black on white in every colour that carries letters', () => {
    const printed = tokensOf('html[data-theme] {')
    for (const name of ['ink', 'slate', 'plum', 'within', 'over', 'brass', 'info']) expect(printed[name]).toBe('#000000')
  })
})
