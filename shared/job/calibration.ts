/** Whether an instrument may be used on a day, as a verdict and a sentence. */
import { daysBetween, formatDay, type Day } from '../utils/dates'
import type { Verdict } from '../utils/verdict'
import { CALIBRATION_NOTICE_DAYS } from './today'

interface Calibrated { calibrations: readonly { doneOn: Day, goodUntil: Day }[] }

/** The calibration that covers the day, or null. */
export function calibrationOn(instrument: Calibrated, day: Day): { doneOn: Day, goodUntil: Day } | null {
  return instrument.calibrations.filter(each => each.doneOn <= day && each.goodUntil >= day).sort((a, b) => b.goodUntil.localeCompare(a.goodUntil))[0] ?? null
}

/** How it stands today. Running out soon is worth a look, so it is marked like an Unexpected; out of calibration is outside. */
export function calibrationVerdict(instrument: Calibrated, today: Day): { verdict: Verdict, sentence: string } {
  const now = calibrationOn(instrument, today)
  if (now) {
    const left = daysBetween(today, now.goodUntil)
    const days = left === 0 ? 'today is its last day' : left === 1 ? '1 day left' : `${left} days left`
    return left <= CALIBRATION_NOTICE_DAYS
      ? { verdict: 'unexpected', sentence: `In calibration until ${formatDay(now.goodUntil)}: ${days}` }
      : { verdict: 'within', sentence: `In calibration until ${formatDay(now.goodUntil)}` }
  }
  const last = [...instrument.calibrations].sort((a, b) => b.goodUntil.localeCompare(a.goodUntil))[0]
  if (!last) return { verdict: 'not-entered', sentence: 'No calibration is on file: it cannot be used for readings' }
  return last.doneOn > today
    ? { verdict: 'waiting', sentence: `Its calibration begins on ${formatDay(last.doneOn)}` }
    : { verdict: 'outside', sentence: `Out of calibration since ${formatDay(last.goodUntil)}: readings taken with it after that day are refused` }
}
