const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', hour12: false, timeZone: 'Europe/London' })

/** A UTC instant (ISO text) as the clock on the wall in London showed it: "14:02". Unreadable text gives a dash in words. */
export function clockTime(instant: string): string {
  const moment = new Date(instant)
  return Number.isNaN(moment.getTime()) ? 'at an unknown time' : clock.format(moment)
}
