import { readdirSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { expect, it } from 'vitest'

const app = fileURLToPath(new URL('../../../app/', import.meta.url))
const files = readdirSync(app, { recursive: true, encoding: 'utf8' }).filter(name => /\.(vue|ts|css)$/.test(name) && !name.endsWith('tokens.css'))

/** `#abc`, `#aabbcc`, `rgb(…)`, `hsl(…)` as a value: after a colon, a quote, a bracket or a blank. */
const LITERAL = /(?<=[:\s'"[(,])(#[0-9a-f]{3}\b|#[0-9a-f]{6}\b|rgba?\(|hsla?\(|oklch\()/i

it('names colours only in the token file', () => {
  const found = files.filter(name => readFileSync(app + name, 'utf8').split('\n').some(line => LITERAL.test(line)))
  expect(found).toEqual([])
})
