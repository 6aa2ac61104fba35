import { spawn } from 'node:child_process'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const SCRIPT = fileURLToPath(new URL('../../scripts/calc.mjs', import.meta.url))
const NAMES = [
  'design-current', 'rating', 'factor', 'volt-drop', 'cable-size', 'conductor-resistance', 'loop', 'zs-limit', 'disconnection-time', 'fault-current',
  'breaking-capacity', 'adiabatic', 'let-through', 'protective-conductor', 'bonding', 'demand', 'recorded-demand', 'supply', 'day', 'circuit',
  'pen-electrode', 'pen-three-phase', 'tt-electrode', 'pilot', 'rcd-test', 'insulation-test', 'reading-fits', 'mpan', 'network-route', 'deadlines',
  'smart-window', 'certificate-kind', 'grant', 'invoice', 'cancellation', 'mounting', 'earthing-method',
]
const MPAN = { mpan: '1312345678907' }
// Each call starts a process of its own; a busy machine takes its time.
const START_UP_MS = 60_000

interface Outcome { status: number | null, reply: unknown, errors: string }

function calc(args: string[], typed = ''): Promise<Outcome> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [SCRIPT, ...args], { stdio: ['pipe', 'pipe', 'pipe'] })
    let printed = ''
    let errors = ''
    child.stdout.on('data', chunk => printed += chunk)
    child.stderr.on('data', chunk => errors += chunk)
    child.on('error', reject)
    child.on('close', status => resolve({ status, reply: JSON.parse(printed), errors }))
    child.stdin.on('error', () => undefined)
    child.stdin.end(typed)
  })
}

const aRefusal = { error: { message: expect.stringMatching(/./), issues: [{ path: expect.any(String), message: expect.stringMatching(/./) }] } }

describe('npm run calc', { timeout: START_UP_MS }, () => {
  it('answers one object from standard input', async () => {
    const { status, reply, errors } = await calc(['mpan'], JSON.stringify(MPAN))
    expect([status, errors]).toEqual([0, ''])
    expect(reply).toMatchObject({ verdict: null, result: { valid: true, distributor: '13' }, missing: [], reasons: [] })
  })

  it('answers a file named last', async () => {
    const folder = await mkdtemp(join(tmpdir(), 'calc-'))
    const file = join(folder, 'question.json')
    await writeFile(file, `\uFEFF${JSON.stringify([MPAN])}`)
    const { status, reply } = await calc(['mpan', file])
    await rm(folder, { recursive: true })
    expect(status).toBe(0)
    expect(reply).toMatchObject([{ result: { valid: true } }])
  })

  it('refuses a bad item of an array in its own place and answers the others', async () => {
    const { status, reply } = await calc(['mpan'], JSON.stringify([MPAN, { mpan: 13 }, MPAN]))
    expect(status).toBe(0)
    expect(reply).toMatchObject([{ result: { valid: true } }, { error: { issues: [{ path: 'mpan' }] } }, { result: { valid: true } }])
  })

  it.each([
    ['a wrong type', ['mounting'], '{"lowest_m":"high","kind":"socket"}'],
    ['bad JSON', ['mounting'], '{"lowest_m":NaN}'],
    ['an unknown name', ['nothing-of-the-kind'], '{}'],
    ['no name', [], ''],
    ['a file that is not there', ['mounting', 'not-there.json'], ''],
  ])('refuses %s with status 2', async (_, args, typed) => {
    const { status, reply, errors } = await calc(args, typed)
    expect([status, errors]).toEqual([2, ''])
    expect(reply).toEqual(aRefusal)
  })

  it('lists every name with its purpose and schema', async () => {
    const { status, reply } = await calc(['list'])
    const listed = reply as { name: string, purpose: string, input: { properties: object } }[]
    expect(status).toBe(0)
    expect(listed.map(each => each.name).sort()).toEqual([...NAMES].sort())
    expect(listed.every(each => each.purpose && Object.keys(each.input.properties).length > 0)).toBe(true)
  })
})
