/**
 * What waits for a person, as sentences with a verb: the rows of Today, their order and their age. Which things wait is
 * the database's answer (`server/db/queries/today.ts`); how they are said stands here alone.
 */
import type { Country } from '../types/firm'
import { daysBetween, formatDay, londonDay, type Day } from '../utils/dates'
import { workingDaysBetween } from './working-days'

export const WAITING_KINDS = [
  'notice', 'calibrate', 'sent-back', 'confirm-readings', 'visit', 'finish-work', 'check', 'message-failed', 'message-unclear',
  'call', 'make-quote', 'ask-about-quote', 'book-install', 'send-pack', 'waiting-on', 'held-up',
] as const
export type WaitingKind = (typeof WAITING_KINDS)[number]

export interface WaitingThing {
  kind: WaitingKind
  /** The row it comes from: a job's id, a notice's, an instrument's. */
  id: string
  jobId: string | null
  ref: string
  customer: string
  address: string
  postcode: string
  country: Country
  /** Since when it waits, as an instant; null where only its day counts. */
  since: string | null
  /** The day by which it must be done, where there is one. */
  due: Day | null
  /** What else its sentence names: a recipient, an instrument, a kind of visit, a number. */
  detail: string
}

export interface OnSiteRow { jobId: string, crew: string, address: string, postcode: string, kind: string, day: Day, readings: number, lastAt: string | null }
export interface ComingRow { visitId: string, jobId: string, day: Day, half: 'am' | 'pm', crew: string, kind: string, customer: string, address: string, postcode: string }
export interface TodayView { waiting: WaitingThing[], onSite: OnSiteRow[], coming: ComingRow[] }

/** One row as shown. `order` sorts: the smaller, the more urgent. */
export interface WaitingRow { key: string, sentence: string, about: string, to: string, age: string, ageSpeech: string, edge: 'solid' | 'dash' | 'none', workingDays: number, order: number }

export const VISIT_WORDS: Record<string, string> = { survey: 'Survey', install: 'Install', return: 'Return visit' }
export const HALF_WORDS = { am: 'morning', pm: 'afternoon' } as const

/** Days before an instrument's calibration runs out from which it asks for attention. */
export const CALIBRATION_NOTICE_DAYS = 30
/** Working days after which a last day near at hand is marked. */
const NEAR_DAYS = 5

const plural = (n: number, word: string) => `${n} ${word}${n === 1 ? '' : 's'}`

/** The sentence of a thing that waits. */
export function sayWaiting(thing: WaitingThing, today: Day): string {
  const who = thing.customer
  switch (thing.kind) {
    case 'notice': return thing.due && daysBetween(thing.due, today) > 0 ? `Send the overdue notice to ${lower(thing.detail)}` : `Send the notice to ${lower(thing.detail)}${thing.due ? ` by ${formatDay(thing.due)}` : ''}`
    case 'calibrate': return thing.due && daysBetween(thing.due, today) > 0 ? `Have ${thing.detail} calibrated: it ran out on ${formatDay(thing.due)}` : `Have ${thing.detail} calibrated${thing.due ? ` before ${formatDay(thing.due)}` : ''}`
    case 'sent-back': return `Answer ${Number(thing.detail) > 1 ? `the ${thing.detail} queries` : 'the query'} of the check and sign again`
    case 'confirm-readings': return `Confirm ${plural(Number(thing.detail) || 1, 'reading')} typed from your sheet`
    case 'visit': return sayVisit(thing, today)
    case 'finish-work': return 'Finish the work and sign for it'
    case 'check': return 'Check the sheet and countersign'
    case 'message-failed': return `Look at the message that did not go: ${thing.detail}`
    case 'message-unclear': return `Find out whether the message arrived: ${thing.detail}`
    case 'call': return `Call ${who} and book the survey`
    case 'make-quote': return `Make the quote for ${who}`
    case 'ask-about-quote': return `Ask ${who} about the quote`
    case 'book-install': return `Book the installation for ${who}`
    case 'send-pack': return `Send ${who} the pack`
    case 'waiting-on': return thing.detail ? `Look after what this waits for: ${thing.detail}` : 'Look after what this job waits for'
    case 'held-up': return `Ask what holds this job: with ${thing.detail}`
    default: return thing.kind satisfies never
  }
}

/** A recipient within a sentence: "the network operator", "building control", but a name as it is. */
function lower(words: string): string {
  if (!/^[A-Z][a-z]+(?:,| [a-z])/.test(words)) return words
  const small = words[0]!.toLowerCase() + words.slice(1)
  return /^(?:network operator|grant body)/.test(small) ? `the ${small}` : small
}

function sayVisit(thing: WaitingThing, today: Day): string {
  const [kind = '', half = 'am'] = thing.detail.split(' ')
  const verb = kind === 'survey' ? 'Survey' : kind === 'install' ? 'Install' : 'Go back to'
  const away = thing.due ? daysBetween(today, thing.due) : 0
  const when = away === 0 ? `this ${half === 'pm' ? 'afternoon' : 'morning'}` : away === 1 ? `tomorrow ${half === 'pm' ? 'afternoon' : 'morning'}` : thing.due ? formatDay(thing.due) : ''
  return kind === 'install' ? `Install for ${thing.customer} ${when}` : `${verb} ${kind === 'survey' ? `for ${thing.customer}` : thing.customer} ${when}`
}

/** Where a press on the row leads: the page where the thing is done. */
function placeOf(thing: WaitingThing): string {
  const job = `/jobs/${thing.jobId}`
  switch (thing.kind) {
    case 'notice': return `/notices#notice-${thing.id}`
    case 'calibrate': return `/kit#instrument-${thing.id}`
    case 'check': return `/countersign/${thing.jobId}`
    case 'call': return `/diary?book=${thing.jobId}&kind=survey`
    case 'book-install': return `/diary?book=${thing.jobId}&kind=install`
    case 'make-quote':
    case 'ask-about-quote': return `${job}/quote`
    case 'confirm-readings': return `${job}/dead`
    case 'sent-back':
    case 'finish-work':
    case 'send-pack': return `${job}/leave`
    default: return job
  }
}

/** A thing as a row: its sentence, its age or its days left in working days, and how pressing it is. */
export function toWaitingRow(thing: WaitingThing, today: Day): WaitingRow {
  const isDated = thing.due !== null && thing.kind !== 'visit'
  const left = thing.due ? workingDaysBetween(today, thing.due, thing.country) : null
  const old = thing.since ? Math.max(0, workingDaysBetween(londonDay(thing.since), today, thing.country)) : 0
  const isLate = isDated && left !== null && (left < 0 || daysBetween(thing.due!, today) > 0)
  const isNear = thing.kind === 'visit' ? thing.due === today : isDated && left !== null && left <= NEAR_DAYS
  const age = isDated ? sayLeft(left!, isLate) : thing.kind === 'visit' ? '' : old === 0 ? 'today' : `${old} wd`
  return {
    key: `${thing.kind}-${thing.id}`,
    sentence: sayWaiting(thing, today),
    about: [thing.address, thing.postcode].filter(Boolean).join(', '),
    to: placeOf(thing),
    age,
    ageSpeech: isDated ? sayLeftInFull(left!, isLate) : thing.kind === 'visit' ? '' : old === 0 ? 'since today' : `waiting ${plural(old, 'working day')}`,
    edge: isLate || thing.kind === 'sent-back' || thing.kind === 'message-failed' ? 'solid' : isNear || thing.kind === 'message-unclear' ? 'dash' : 'none',
    workingDays: isDated ? 0 : old,
    order: isLate ? -10_000 - Math.abs(left!) : isNear ? -1_000 + (left ?? 0) : thing.kind === 'sent-back' || thing.kind === 'message-failed' ? -500 - old : isDated ? left! : -old,
  }
}

const sayLeft = (left: number, isLate: boolean) => isLate ? `${Math.abs(left)} wd late` : left === 0 ? 'today' : `${left} wd left`
const sayLeftInFull = (left: number, isLate: boolean) => isLate ? `${plural(Math.abs(left), 'working day')} late` : left === 0 ? 'due today' : `${plural(left, 'working day')} left`

/** Everything that waits as rows, what is late first, then what is near, then the oldest. */
export function waitingRows(things: readonly WaitingThing[], today: Day): WaitingRow[] {
  return things.map(thing => toWaitingRow(thing, today)).sort((a, b) => a.order - b.order || a.sentence.localeCompare(b.sentence, 'en-GB'))
}

/** The row that has waited longest, or null where nothing has waited a working day. */
export function oldestRow(rows: readonly WaitingRow[]): WaitingRow | null {
  const oldest = rows.reduce<WaitingRow | null>((found, row) => row.workingDays > (found?.workingDays ?? 0) ? row : found, null)
  return oldest
}
