/** The demo's days and small chances: the same for everybody on one day, and always round about today. */

/** Mulberry32: a small generator whose numbers depend on its seed alone. */
export function seededRandom(seed) {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6D2B79F5) >>> 0
    let t = Math.imul(state ^ (state >>> 15), state | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296
  }
}

/**
 * Days counted from the London day of `now`. Work falls on weekdays: a weekend moves on to its Monday, or for the past
 * back to its Friday.
 */
export function demoClock(now, { londonDay, addDays, weekdayOf }) {
  const today = londonDay(now)
  const offWeekend = { Sat: [2, -1], Sun: [1, -2] }
  const day = (offset) => {
    const plain = addDays(today, offset)
    const move = offWeekend[weekdayOf(plain)]
    return move ? addDays(plain, offset < 0 ? move[1] : move[0]) : plain
  }
  return {
    now, today,
    /** A plain day so many days from today, weekend or not. */
    date: offset => addDays(today, offset),
    /** A working day about so many days from today. */
    day,
    /** A moment on that working day; what would lie ahead is pulled back to now. */
    at: (offset, time) => {
      const moment = new Date(`${day(offset)}T${time}:00Z`).toISOString()
      return moment > now ? now : moment
    },
  }
}
