/** Free half-days to offer, the ones that cost least travel first; and what speaks against putting a visit somewhere. */
import type { Diary, DiaryVisit } from '../schemas/job'
import type { Country } from '../types/firm'
import { addDays, formatDay, type Day } from '../utils/dates'
import { districtOf } from './intake/uk-formats'
import { HALF_WORDS, VISIT_WORDS } from './today'
import { holidayOn, isWorkingDay } from './working-days'

export interface Slot { day: Day, half: 'am' | 'pm', crewId: string, crew: string, /** Why it stands where it stands in the list. */ why: string }
interface Wanted { postcode: string, country: Country, day?: Day | null, half?: 'am' | 'pm' | null }

/** The working days from a day on. */
export function workingDaysFrom(from: Day, count: number, country: Country): Day[] {
  const days: Day[] = []
  for (let day = from; days.length < count; day = addDays(day, 1)) if (isWorkingDay(day, country)) days.push(day)
  return days
}

/**
 * Half-days on which a crew has nothing yet. First those on the day asked for, then those where the crew is in the same
 * postcode district that day, then simply the earliest.
 */
export function freeSlots(diary: Diary, wanted: Wanted, from: Day, count = 9): Slot[] {
  const district = districtOf(wanted.postcode)
  const slots = workingDaysFrom(from, 10, wanted.country).flatMap((day, at) => (['am', 'pm'] as const).flatMap(half => diary.crews.filter(crew => crew.people.length).flatMap((crew) => {
    const thatDay = diary.visits.filter(visit => visit.day === day && visit.crewId === crew.id)
    if (thatDay.some(visit => visit.half === half)) return []
    const isAsked = (!wanted.day || day === wanted.day) && (!wanted.half || half === wanted.half) && Boolean(wanted.day ?? wanted.half)
    const isNear = district !== '' && thatDay.some(visit => districtOf(visit.postcode) === district)
    const why = [isAsked && 'asked for', isNear && `${crew.name} is in ${district} that day`].filter(Boolean).join(', ')
    return [{ day, half, crewId: crew.id, crew: crew.name, why, rank: (isAsked ? -1000 : 0) + (isNear ? -100 : 0) + at * 2 + (half === 'pm' ? 1 : 0) }]
  })))
  return slots.sort((a, b) => a.rank - b.rank).slice(0, count).map(({ rank: _, ...slot }) => slot)
}

export interface Place { day: Day, half: 'am' | 'pm', crewId: string }

/** What speaks against putting the visit there, as sentences; empty where nothing does. */
export function objections(diary: Diary, visit: Pick<DiaryVisit, 'kind'> & { id: string | null }, place: Place, today: Day, country: Country = 'England'): string[] {
  const crew = diary.crews.find(each => each.id === place.crewId)
  const others = diary.visits.filter(each => each.id !== visit.id && each.day === place.day && each.half === place.half && each.crewId === place.crewId && each.state === 'booked')
  const name = crew?.name ?? 'This crew'
  const holiday = holidayOn(place.day, country)
  return [
    others.length ? `${name} has ${others.length === 1 ? 'a visit' : `${others.length} visits`} already that ${HALF_WORDS[place.half]}: ${others.map(other => `${VISIT_WORDS[other.kind]}, ${districtOf(other.postcode)}`).join('; ')}.` : '',
    crew && !crew.people.length ? `${name} has nobody in it.` : '',
    place.day < today ? `${formatDay(place.day)} lies behind you.` : '',
    holiday ? `${formatDay(place.day)} is ${holiday}.` : '',
  ].filter(Boolean)
}

/** A place in words: "Tue 8 Dec, morning, Crew A". */
export function placeWords(place: Place, diary: Diary): string {
  return `${formatDay(place.day).replace(/ \d{4}$/, '')}, ${HALF_WORDS[place.half]}, ${diary.crews.find(crew => crew.id === place.crewId)?.name ?? 'no crew'}`
}
