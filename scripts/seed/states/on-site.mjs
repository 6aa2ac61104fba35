import { LIMITER_60 } from '../designs.data.mjs'
import { finishWork, startWork } from '../site.mjs'
import { figuresOf, readSupply } from '../work.mjs'

/** Work finished and ready to be signed, without and with a load limiter. */
export async function readyToSign(acts) {
  const ready = await startWork(acts, 'readyToSign', { design: 'shortTwin', daysAgo: 1, serial: 'FL7-004182' })
  await finishWork(acts, ready, figuresOf('shortTwin'))

  const managed = await startWork(acts, 'limiterOnSite', { survey: 'pme60', demand: 'busy', design: 'armoured', limiter: LIMITER_60, daysAgo: 2, crew: 'B', serial: 'FL7-004170' })
  await finishWork(acts, managed, figuresOf('armoured'), { limiter: true })
}

/** Work under way, or that something stops: a loop outside, a reading that does not fit, a sheet of paper half confirmed. */
export async function onSite(acts) {
  // A joint at the isolator: the loop is above what the device allows, a re-test on the same day no better.
  const outside = await startWork(acts, 'loopOutside', { design: 'armoured', daysAgo: 3, crew: 'B', serial: 'FL7-003995' })
  await finishWork(acts, outside, figuresOf('armoured', { Zs: '1.21' }))
  await acts.read(outside.who, outside.job, 'Zs', '1.18', { at: outside.at('13:45'), context: { ambient_C: 12, cause: 'connection' } })
  await acts.book(outside.job, 'return', 2, 'pm', 'B', { hours: 2, note: 'Open the isolator and remake the joint' })

  // Within its limit, yet more than twice what the cable should give.
  const odd = await startWork(acts, 'unexpected', { design: 'shortTwin', daysAgo: 4, serial: 'FL7-003871' })
  await finishWork(acts, odd, figuresOf('shortTwin', { 'R1R2': '0.34', 'R1Rn': '0.19', 'Zs': '0.55' }))

  // A sheet from the van, typed by the office and half confirmed by the measurer.
  const sheet = await startWork(acts, 'paperSheet', { design: 'shortTwin', daysAgo: 2, half: 'pm', serial: 'FL7-004055' })
  await readSupply(acts, sheet.who, sheet.job, figuresOf('shortTwin'), sheet.at('13:30'))
  for (const [test, typed] of [['R1R2', '0.15'], ['IR-live-earth', '>200'], ['IR-neutral-earth', '>200'], ['IR-line-neutral', '>200']]) {
    const id = await acts.read('office', sheet.job, test, typed, { at: sheet.at('14:40'), measuredBy: 'installer' })
    if (test === 'R1R2') await acts.confirmReading('installer', sheet.job, id)
  }

  // Under way this morning: half of the dead tests taken.
  const today = await startWork(acts, 'deadTests', { design: 'shortTwin', daysAgo: 0, serial: 'FL7-004201' })
  const figures = figuresOf('shortTwin')
  await readSupply(acts, today.who, today.job, figures, today.at('10:10'))
  await acts.read(today.who, today.job, 'R1R2', '0.14', { at: today.at('10:30'), context: { ambient_C: 12 } })
  await acts.read(today.who, today.job, 'IR-live-earth', '>999', { at: today.at('10:36') })
}
