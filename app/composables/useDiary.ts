import { objections, placeWords, workingDaysFrom, type Place } from '#shared/job/slots'
import { VISIT_WORDS } from '#shared/job/today'
import type { Diary, DiaryVisit } from '#shared/schemas/job'
import type { JobRecord } from '#shared/types/record'
import { addDays, weekdayOf, type Day } from '#shared/utils/dates'

/** A visit that has been picked up, or a job that wants its first one (`id` is null until it is put down). */
export type InHand = Pick<DiaryVisit, 'jobId' | 'ref' | 'kind' | 'customer' | 'postcode' | 'address' | 'hours' | 'version'> & { id: string | null, was: Place | null }
export const HOURS: Record<DiaryVisit['kind'], number> = { survey: 2, install: 4, return: 2 }

/** Monday of the week a day lies in. */
export function mondayOf(day: Day): Day {
  return addDays(day, -((['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'] as string[]).indexOf(weekdayOf(day))))
}

/** Two weeks of the diary and what is in hand: picking up, putting down, taking back. Nothing here navigates or asks twice. */
export async function useDiary(today: Day, from: Ref<Day>) {
  const { act, isBusy, problem: refusal, forget } = useAct()
  const { answer: diary, problem, isAsking, again } = await useAnswer('diary', () => callApi<Diary>('/api/diary', { query: { from: from.value, days: 14 } }), [from])
  const days = computed(() => workingDaysFrom(from.value, 10, 'England').filter(day => day < addDays(from.value, 14)))
  const tray = ref<InHand[]>([])
  const hand = computed(() => tray.value[0] ?? null)
  /** A place that something speaks against: the next put-down there goes through. */
  const asked = ref<{ place: Place, sentences: string[] } | null>(null)
  const done = ref<{ sentence: string, undo: (() => Promise<void>) | null } | null>(null)
  /** Somebody else moved the same visit: where it is now, and where it was meant to go. */
  const stale = ref<{ visit: InHand, meant: Place, message: string } | null>(null)

  const visitsAt = (place: Place) => diary.value?.visits.filter(visit => visit.day === place.day && visit.half === place.half && visit.crewId === place.crewId) ?? []
  const isInHand = (visit: DiaryVisit) => tray.value.some(each => each.id === visit.id)
  const words = (visit: Pick<InHand, 'kind' | 'customer'>) => `${VISIT_WORDS[visit.kind]} for ${visit.customer}`

  function pickUp(visit: DiaryVisit) {
    asked.value = null
    done.value = null
    if (visit.state !== 'booked') return
    if (isInHand(visit)) return putBack(visit.id)
    tray.value = [{ ...visit, was: { day: visit.day, half: visit.half, crewId: visit.crewId } }, ...tray.value]
  }
  function putBack(id: string | null) {
    asked.value = null
    tray.value = tray.value.filter(each => each.id !== id)
  }
  const takeFirst = (visit: InHand) => tray.value = [visit, ...tray.value.filter(each => each !== visit)]

  /** Takes a job into the hand that has no visit yet. */
  async function takeJob(jobId: string, kind: DiaryVisit['kind']) {
    const record = await callApi<JobRecord>(`/api/jobs/${jobId}/record`).catch(() => null)
    if (!record) return
    tray.value = [{ id: null, was: null, jobId, kind, ref: record.job.ref, customer: record.customer.name, postcode: record.premises.postcode, address: record.premises.address, hours: HOURS[kind], version: 0 }, ...tray.value]
  }

  async function putDown(place: Place) {
    const visit = hand.value
    if (!visit || !diary.value) return
    if (visit.was && place.day === visit.was.day && place.half === visit.was.half && place.crewId === visit.was.crewId) return putBack(visit.id)
    const sentences = objections(diary.value, visit, place, today)
    const isAskedAlready = asked.value && asked.value.place.day === place.day && asked.value.place.half === place.half && asked.value.place.crewId === place.crewId
    if (sentences.length && !isAskedAlready) return void (asked.value = { place, sentences })
    asked.value = null
    await (visit.id ? move({ ...visit, id: visit.id }, place) : book(visit, place))
  }

  async function book(visit: InHand, place: Place) {
    const made = await act<{ id: string }>('/api/visits', { jobId: visit.jobId, kind: visit.kind, ...place, hours: visit.hours, note: '' })
    if (!made) return
    tray.value = tray.value.filter(each => each !== visit)
    await again()
    done.value = { sentence: `Booked: ${words(visit)}, ${placeWords(place, diary.value!)}.`, undo: null }
  }

  async function move(visit: InHand & { id: string }, place: Place) {
    const moved = await act<{ version: number }>(`/api/visits/${visit.id}`, { baseVersion: visit.version, ...place }, { method: 'PATCH' })
    if (moved) {
      tray.value = tray.value.filter(each => each.id !== visit.id)
      await again()
      const was = visit.was
      done.value = { sentence: `${words(visit)} moved to ${placeWords(place, diary.value!)}. The customer has not been told.`, undo: was ? () => takeBack({ ...visit, version: moved.version, was: place }, was) : null }
    }
    else if (refusal.value?.code === 'stale-copy') {
      const message = refusal.value.message
      forget()
      tray.value = tray.value.filter(each => each.id !== visit.id)
      await again()
      const now = diary.value?.visits.find(each => each.id === visit.id)
      stale.value = { visit: now ? { ...visit, version: now.version, was: { day: now.day, half: now.half, crewId: now.crewId } } : visit, meant: place, message }
    }
  }

  async function takeBack(visit: InHand & { id: string }, place: Place) {
    done.value = null
    await move(visit, place)
  }

  /** After a clash: puts it where it was meant to go, on top of what somebody else did. */
  async function moveAfterAll() {
    const clash = stale.value
    stale.value = null
    if (clash?.visit.id) await move({ ...clash.visit, id: clash.visit.id }, clash.meant)
  }

  return { diary, problem, refusal, isAsking, isBusy, again, days, tray, hand, asked, done, stale, visitsAt, isInHand, words, pickUp, putBack, takeFirst, takeJob, putDown, moveAfterAll }
}
