/**
 * How the reading pad behaves, without a screen: one state, one function per press. Nothing is dropped silently: a refused press leaves
 * what was keyed as it was and says why. An odd figure (five times the design value or a fifth of it) must be keyed twice.
 */

export type PadKey = '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8' | '9' | '.' | '>' | 'back' | 'clear' | 'unit' | 'lim' | 'na' | 'keys' | 'keep'

export interface PadSetup {
  /** Units to toggle between; the first is the one `expected`, `resolution` and `judge` speak in. */
  units: readonly string[]
  /** Design value in the first unit, if there is one. */
  expected?: number
  /** Smallest step the tester shows, per unit or for the first unit: 0.01. */
  resolution?: number | Readonly<Record<string, number>>
  /** The tester's own top value, which ">" alone stands for, per unit or for the first unit. */
  topValue?: number | Readonly<Record<string, number>>
}

export interface PadState {
  /** Characters keyed, with the leading nought drawn: "0.21". */
  typed: string
  /** Over range: the tester showed more than it can count. */
  over: boolean
  unit: string
  /** The odd figure that waits to be keyed again. */
  confirm: KeptValue | null
  /** Which reason is being asked for. */
  asking: 'limited' | 'not-applicable' | null
  message: string | null
  /** How the last press was answered: none, one soft buzz, two. */
  buzz: 0 | 1 | 2
  kept: Kept | null
}

export interface KeptValue { kind: 'value' | 'over-range', shown: string, value: number, unit: string, reason: null }
export interface KeptReason { kind: 'limited' | 'not-applicable', shown: 'LIM' | 'N/A', value: null, unit: string, reason: string }
/** A reading as the pad hands it on; the page adds person, instrument and moment. */
export type Kept = KeptValue | KeptReason

/** How far from the design value a figure may be before it must be keyed twice. */
export const GUARD_FACTOR = 5
const MOST_DIGITS = 6

const PREFIX: Readonly<Record<string, number>> = { 'MΩ': 1e6, 'kΩ': 1e3, 'mΩ': 1e-3, 'mA': 1e-3, 'kA': 1e3, 'mV': 1e-3, 'kV': 1e3, 'ms': 1e-3 }

/** A figure of one unit in another of the same kind: 0.5 MΩ -> 500 kΩ. */
export function inUnit(value: number, from: string, to: string): number {
  return from === to ? value : value * (PREFIX[from] ?? 1) / (PREFIX[to] ?? 1)
}

export function openPad(setup: PadSetup): PadState {
  return { typed: '', over: false, unit: setup.units[0] ?? '', confirm: null, asking: null, message: null, buzz: 0, kept: null }
}

/** The figure keyed so far, or null while there is none to read. */
export function padValue(state: Pick<PadState, 'typed'>): number | null {
  return /^\d+(\.\d+)?$/.test(state.typed) ? Number(state.typed) : null
}

/** What the display shows: "> 999 MΩ". */
export function padShown(state: Pick<PadState, 'typed' | 'over' | 'unit'>): string {
  return [state.over ? '>' : '', state.typed, state.unit].filter(Boolean).join('\u2009')
}

const perUnit = (given: PadSetup['resolution'], setup: PadSetup, unit: string): number | undefined =>
  typeof given === 'object' ? given[unit] : unit === setup.units[0] ? given : undefined

const decimalsOf = (step: number): number => (String(step).split('.')[1] ?? '').length
const refuse = (state: PadState, message: string): PadState => ({ ...state, message, buzz: 1, kept: null })
const settle = (state: PadState, change: Partial<PadState>): PadState => ({ ...state, message: null, buzz: 0, kept: null, ...change })

function pressDigit(state: PadState, digit: string, setup: PadSetup): PadState {
  if (state.typed === '0') return refuse(state, digit === '0' ? 'One leading 0 is enough: the point comes next.' : `After a leading 0 comes the point. Rub out the 0 to key ${digit}.`)
  const decimals = state.typed.split('.')[1]
  const step = perUnit(setup.resolution, setup, state.unit)
  if (decimals !== undefined && step !== undefined && decimals.length >= decimalsOf(step)) return refuse(state, `The tester reads in steps of ${step}\u2009${state.unit}: no further decimal.`)
  if (state.typed.replace('.', '').length >= MOST_DIGITS) return refuse(state, `${MOST_DIGITS} figures are the most.`)
  return settle(state, { typed: state.typed + digit })
}

function pressPoint(state: PadState, setup: PadSetup): PadState {
  if (state.typed.includes('.')) return refuse(state, 'There is a point already.')
  const step = perUnit(setup.resolution, setup, state.unit)
  if (step !== undefined && decimalsOf(step) === 0) return refuse(state, `The tester reads in steps of ${step}\u2009${state.unit}: no decimal.`)
  return settle(state, { typed: `${state.typed || '0'}.` })
}

function pressOver(state: PadState, setup: PadSetup): PadState {
  if (state.over) return settle(state, { over: false })
  const top = perUnit(setup.topValue, setup, state.unit)
  return settle(state, { over: true, typed: state.typed || (top === undefined ? '' : String(top)) })
}

/** Whether a figure is so far from the design value that a slip of the point is likelier than the figure. */
export function isOdd(value: number, unit: string, setup: PadSetup): boolean {
  if (!setup.expected || setup.expected <= 0) return false
  const ratio = inUnit(value, unit, setup.units[0] ?? unit) / setup.expected
  // A whisker of tolerance, so that five times the design is odd whatever binary fractions make of it.
  return ratio >= GUARD_FACTOR * (1 - 1e-9) || ratio <= (1 + 1e-9) / GUARD_FACTOR
}

function pressKeep(state: PadState, setup: PadSetup): PadState {
  if (state.typed.endsWith('.')) return refuse(state, 'Key the figure after the point, or rub the point out.')
  const value = padValue(state)
  if (value === null) return refuse(state, state.over ? 'Key the top value the tester shows.' : 'Key what the tester shows first.')
  const reading: KeptValue = { kind: state.over ? 'over-range' : 'value', shown: (state.over ? '>' : '') + state.typed, value, unit: state.unit, reason: null }
  const first = state.confirm
  if (first) {
    const agrees = first.kind === reading.kind && first.value === value && first.unit === reading.unit
    if (agrees) return settle(state, { confirm: null, kept: reading })
    return { ...state, confirm: null, kept: null, buzz: 2, message: `First ${first.shown}\u2009${first.unit}, now ${reading.shown}\u2009${reading.unit}. Look at the tester, then keep the one it shows.` }
  }
  if (reading.kind === 'value' && isOdd(value, state.unit, setup)) {
    return { ...state, typed: '', confirm: reading, kept: null, buzz: 2, message: `${reading.shown}\u2009${reading.unit} is far from the design. Key it again to confirm.` }
  }
  return settle(state, { kept: reading })
}

/** The state after a press. `kept` is set in exactly the state in which a reading was accepted. */
export function pressPad(state: PadState, key: PadKey, setup: PadSetup): PadState {
  switch (key) {
    case '.': return pressPoint(state, setup)
    case '>': return pressOver(state, setup)
    case 'back': return settle(state, state.typed ? { typed: state.typed.slice(0, -1) } : { over: false })
    case 'clear': return settle(state, { typed: '', over: false })
    case 'unit': return setup.units.length < 2
      ? refuse(state, `This reading has one unit: ${state.unit}.`)
      : settle(state, { unit: setup.units[(setup.units.indexOf(state.unit) + 1) % setup.units.length] ?? state.unit })
    case 'lim': return settle(state, { asking: 'limited' })
    case 'na': return settle(state, { asking: 'not-applicable' })
    case 'keys': return settle(state, { asking: null })
    case 'keep': return pressKeep(state, setup)
    default: return pressDigit(state, key, setup)
  }
}

/** Ends the question why a reading is limited or does not apply; a blank reason is refused. */
export function giveReason(state: PadState, reason: string): PadState {
  const words = reason.trim()
  if (!state.asking) return state
  if (!words) return refuse(state, 'Say why in a few words.')
  return settle(state, { asking: null, kept: { kind: state.asking, shown: state.asking === 'limited' ? 'LIM' : 'N/A', value: null, unit: state.unit, reason: words } })
}

const KEYBOARD: ReadonlyMap<string, PadKey> = new Map([['.', '.'], [',', '.'], ['Decimal', '.'], ['>', '>'], ['Backspace', 'back'], ['Delete', 'clear'], ['Enter', 'keep'], ['u', 'unit'], ['l', 'lim'], ['n', 'na']])

/** The pad's key for a key of a real keyboard, or null where the pad has none. */
export function padKeyFor(key: string): PadKey | null {
  if (/^[0-9]$/.test(key)) return key as PadKey
  return KEYBOARD.get(key.length === 1 ? key.toLowerCase() : key) ?? null
}
