import { beforeAll, describe, expect, it } from 'vitest'
import { answerCalculation } from '#shared/calculations/answer-calculation'
import electrical from '../fixtures/worked-examples/electrical.json'
import trade from '../fixtures/worked-examples/job.json'
import { ask, type Caller } from '../support/http'
import { makeServedFirm } from '../support/served-firm'

interface Example { id: string, calc: string, input: unknown }
const examples = [...electrical.examples, ...trade.examples] as unknown as Example[]
const byName = new Map<string, Example[]>()
for (const example of examples) byName.set(example.calc, [...byName.get(example.calc) ?? [], example])

let caller: Caller
beforeAll(async () => {
  caller = await (await makeServedFirm()).signIn('installer')
})

const calculate = (name: string, body: unknown) => ask(caller, `POST /api/calculations/${name}`, { body })
/** As it looks once it has travelled as JSON. */
const travelled = (value: unknown) => JSON.parse(JSON.stringify(value)) as unknown

describe('a calculation over HTTP', () => {
  it.each([...byName])('%s answers its worked examples as the engine does', async (name, cases) => {
    const inputs = cases.map(example => example.input)
    const reply = await calculate(name, inputs)
    expect(reply.status).toBe(200)
    expect(reply.json()).toEqual(travelled(answerCalculation(name, inputs).reply))
    const [first] = cases
    const single = await calculate(name, first!.input)
    const { isAnswered, reply: wanted } = answerCalculation(name, first!.input)
    expect([single.status, single.json()]).toEqual([isAnswered ? 200 : 422, travelled(wanted)])
  })

  it.each([
    ['a wrong type', 'mounting', { lowest_m: 'high', kind: 'socket' }],
    ['a misspelt key', 'mounting', { lowest: 1, kind: 'socket' }],
    ['a name nobody knows', 'weather', {}],
    ['a name that every object has', 'constructor', {}],
  ])('refuses %s as the contract says', async (_, name, body) => {
    const reply = await calculate(name, body)
    expect(reply.status).toBe(422)
    expect(reply.json()).toEqual(travelled(answerCalculation(name, body).reply))
    expect(reply.json()).toMatchObject({ error: { issues: [{ path: expect.any(String), message: expect.any(String) }] } })
  })

  it('answers each item of an array in its own place, refused ones too', async () => {
    const body = [{ lowest_m: 1, kind: 'socket' }, { lowest_m: 'high', kind: 'socket' }]
    const reply = await calculate('mounting', body)
    expect([reply.status, reply.json()]).toEqual([200, [expect.objectContaining({ verdict: 'within' }), { error: expect.anything() }]])
  })

  it.each([5, null, 'text', true])('takes no bare %j', async (body) => {
    expect((await ask(caller, 'POST /api/calculations/mounting', { raw: JSON.stringify(body) })).status).toBe(422)
  })
})
