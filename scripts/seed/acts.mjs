/** The acts of a demo job in one line each, every one through the product's own services as the person who would do it. */
import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { demoPhotographs } from './photographs.mjs'

const CREW_OF = { installer: 'A', grace: 'B', owen: 'B' }

export function demoActs({ services, firm, clock, random }) {
  const jobs = []
  /** Version of each row as last answered: a second change of a row is based on it, as on a tablet. */
  const versions = new Map()

  async function send(who, job, kind, payload, { at, baseVersion = null }) {
    const outcome = await services.applyMutation(firm.people[who], { id: randomUUID(), kind, jobId: job.id, baseVersion, at, payload })
    if (outcome.status !== 'applied') throw new Error(`Demo job "${job.name}", ${kind}: ${JSON.stringify(outcome)}`)
    return outcome
  }

  async function enquire(name, { since, customer, premises, wanted, note, about }) {
    const { rating_kW, phases, outlet, ...wishes } = wanted
    const mpan = premises.mpan && `${premises.mpan}${services.mpanCheckDigit(premises.mpan)}`
    const made = await services.addJob(firm.people.office, { mutationId: randomUUID(), customer, premises: { ...premises, mpan }, wanted: { rating_kW, phases, outlet }, note })
    const job = { name, since, changed: since, customer, ...made }
    const at = clock.at(-since, '09:10')
    await acts.change('office', job, 'wanted', 'wanted', wishes, { at })
    await send('office', job, 'change-premises', { fields: about }, { at })
    return job
  }

  const acts = {
    jobs, clock, firm, random, services,

    /** Takes the pictures of those claims of the shot list. */
    photograph: demoPhotographs({ services, firm }, send),

    /** Takes every enquiry, the oldest first, so that numbers run with the days. */
    async enquireAll(homes) {
      const inOrder = Object.entries(homes).sort(([, one], [, other]) => other.since - one.since)
      for (const [name, home] of inOrder) jobs.push(await enquire(name, home))
    },

    /** The job of that situation. */
    job: name => jobs.find(job => job.name === name),

    /** Books a visit on a working day about `offset` days from today. */
    async book(job, kind, offset, half, crew, rest = {}) {
      const { id } = await services.bookVisit(firm.people.office, { mutationId: randomUUID(), jobId: job.id, kind, day: clock.day(offset), half, crewId: firm.crews[crew].id, hours: kind === 'survey' ? 1 : 4, note: '', ...rest })
      return id
    },

    /** Marks a visit as done or cancelled. */
    async closeVisit(visitId, state = 'done', baseVersion = 1) {
      await services.moveVisit(firm.people.office, visitId, { mutationId: randomUUID(), baseVersion, state })
    },

    async change(who, job, part, key, fields, { at, position } = {}) {
      const row = `${job.id}/${part}/${key}`
      const outcome = await send(who, job, services.changeKind(part), { key, fields, ...(position !== undefined && { position }) }, { at: at ?? clock.now, baseVersion: versions.get(row) ?? null })
      versions.set(row, outcome.row.row.version)
    },

    /** The whole record as that person's pages read it. */
    record: (job, who) => firm.people[who].read(tx => services.findJobRecord(tx, firm.id, job.id, firm.people[who].person.crewId)),

    changeJob: (job, fields, at = clock.now) => send('office', job, 'change-job', { fields }, { at }),

    /** Enters a reading as it would be typed: '0.19', '>999', 'correct', 'LIM no access'. */
    async read(who, job, test, typed, { at = clock.now, instrument, context = {}, measuredBy } = {}) {
      const spec = services.TESTS[test]
      const seen = typed === 'correct' || typed === 'wrong'
      const parsed = seen ? { reading: { kind: 'seen', shown: typed, value: null, unit: spec.unit, resolution: null } } : services.parseReading(typed, spec.unit)
      if (!parsed.reading) throw new Error(`Demo job "${job.name}", ${test}: ${parsed.problem}`)
      const { kind, shown, value, unit, resolution, reason = '' } = parsed.reading
      const by = instrument ?? (spec.instrument === 'vehicle-adapter' ? 'adapter' : spec.instrument === null ? null : CREW_OF[measuredBy ?? who] === 'B' ? 'tester2' : 'tester')
      const payload = { id: randomUUID(), test, kind, shown, value, unit, resolution, reason, context, instrumentId: by === null || context.byEnquiry ? null : firm.instruments[by].id, ...(measuredBy && { measuredBy: firm.people[measuredBy].person.id }) }
      await send(who, job, 'add-reading', payload, { at })
      return payload.id
    },

    confirmReading: (who, job, readingId, at = clock.now) => send(who, job, 'confirm-reading', { readingId }, { at }),

    /** The survey is answered: the office moves next. */
    async finishSurvey(job) {
      await services.changeAsFirm(firm.id, async (tx) => {
        const locked = await services.lockJob(tx, firm.id, job.id)
        await services.moveJob(tx, firm.id, locked, 'survey-answered')
        await services.recordEvent(tx, { type: 'survey-answered', jobId: job.id, personId: firm.people.installer.person.id })
      })
    },

    /** Lets lists and ages look like weeks of work instead of one busy second. The chain of events keeps its true moments. */
    async backdate() {
      await services.changeAsFirm(firm.id, async (tx) => {
        for (const { id, since, changed } of jobs) {
          const moment = new Date(clock.at(-changed, `${String(8 + Math.floor(random() * 9)).padStart(2, '0')}:${String(Math.floor(random() * 60)).padStart(2, '0')}`))
          await tx.update(services.job).set({ madeAt: new Date(clock.at(-since, '09:10')), stageSince: moment, changedAt: moment }).where(eq(services.job.id, id))
        }
      })
    },
  }
  return acts
}
