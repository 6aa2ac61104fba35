import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import * as z from 'zod'
import { electricalCalculations } from '#shared/electrical/registry'
import { isCalculationProblem } from '#shared/utils/calculation'
import fixture from '../../fixtures/worked-examples/electrical.json'
import { ask, issuesOf } from './asking'
import { arbitraryOf } from './from-schema'

const calculations = Object.entries(electricalCalculations)

describe('every calculation', () => {
  it('is listed under its own name, with a purpose', () => {
    expect(calculations).toHaveLength(27)
    for (const [name, calculation] of calculations) {
      expect(calculation.name).toBe(name)
      expect(calculation.purpose).toMatch(/\.$/)
    }
  })

  it('has a worked example', () => {
    const shown = new Set(fixture.examples.map(each => each.calc))
    expect(calculations.map(([name]) => name).filter(name => !shown.has(name))).toEqual([])
  })

  it.each(calculations)('%s has an input that turns into JSON Schema and refuses unknown keys', (_name, calculation) => {
    expect(z.toJSONSchema(calculation.input)).toMatchObject({ type: 'object', additionalProperties: false })
  })

  it.each(calculations)('%s waits where nothing is given', (name) => {
    const reply = ask(name, {})
    if (isCalculationProblem(reply)) throw new Error(JSON.stringify(reply))
    expect(reply.verdict).toBe('waiting')
    expect(reply.missing.length).toBeGreaterThan(0)
  })

  it.each(calculations)('%s answers bad input with the contract\'s refusal', (name, calculation) => {
    const numbers = Object.entries(z.toJSONSchema(calculation.input).properties ?? {}).filter(([, each]) => (each as { type?: string }).type === 'number').map(([key]) => key)
    const bad: unknown[] = [null, 7, 'text', [], { notAnInput: 1 }, ...numbers.flatMap(key => [Number.NaN, Number.POSITIVE_INFINITY, 'eleven', null].map(value => ({ [key]: value })))]
    for (const input of bad) {
      for (const issue of issuesOf(name, input)) {
        expect(typeof issue.path).toBe('string')
        expect(issue.message).toMatch(/^[A-Z].*\.$/)
        expect(issue.message).not.toMatch(/invalid|expected|received|NaN/i)
      }
    }
  })

  it.each(calculations)('%s never throws and never lets out what is no number', (name, calculation) => {
    fc.assert(fc.property(arbitraryOf(z.toJSONSchema(calculation.input)), (input) => {
      const reply = ask(name, input)
      if (isCalculationProblem(reply)) {
        expect(reply.error.issues.length).toBeGreaterThan(0)
        return
      }
      expect(JSON.stringify(reply.result)).toBe(JSON.stringify(reply.result, (_key, value) => typeof value === 'number' && !Number.isFinite(value) ? 'not a number' : value))
      for (const step of reply.working) expect(`${step.expression} ${step.value}`).not.toMatch(/NaN|Infinity|undefined/)
      expect([...reply.reasons, ...reply.notes].join(' ')).not.toMatch(/NaN|Infinity|undefined/)
      if (reply.verdict === 'waiting') expect(reply.missing.length).toBeGreaterThan(0)
      else expect(reply.missing).toEqual([])
    }), { numRuns: 150 })
  })

  it.each(calculations)('%s leaves its input as it was', (name, calculation) => {
    const example = fixture.examples.find(each => each.calc === name)!
    const before = structuredClone(example.input)
    calculation.run(example.input)
    expect(example.input).toEqual(before)
  })
})
