import { formatDay } from '#shared/utils/dates'

/** What the customer's page knows of their own charging point; it is not part of the seal. */
export interface LiveWithItFacts {
  /** Where the switch that turns it off is, and how to recognise the way at the consumer unit. */
  isolatorWhere: string
  boardWhere: string
  boardWay: string
  firmName: string
  firmTelephone: string
  /** Whom to ring about a power cut or a damaged supply: 105 in Great Britain. */
  networkTelephone: string
  /** What the load limiter does here, or null where there is none. */
  loadLimit_A: number | null
  /** The longest random delay before a charge starts, in minutes; 0 where there is none. */
  randomDelay_min: number
  /** Day on which the firm's guarantee ends, or null. */
  guaranteeUntil: string | null
}

export interface Advice { title: string, lead: string, steps: string[] }

/** The four pages of "Live with it", in the customer's words. */
export function liveWithIt(facts: LiveWithItFacts): Advice[] {
  return [switchOff(facts), firstCharge(facts), notCharging(facts), lookAfter(facts)]
}

function switchOff(facts: LiveWithItFacts): Advice {
  return {
    title: 'Switch off in a hurry',
    lead: 'If you see smoke, smell burning, feel heat or a tingle, or the case is broken: do not touch the charging point or the cable.',
    steps: [
      `Turn off at ${facts.isolatorWhere}.`,
      `If you cannot reach that, turn off ${facts.boardWay} at the consumer unit, ${facts.boardWhere}.`,
      'If there is fire, leave, keep others away and ring 999.',
      `If the meter or the cable coming into the house is hot or damaged, ring the network operator on ${facts.networkTelephone}.`,
      `Leave it off and ring us: ${facts.firmName}, ${facts.firmTelephone}.`,
    ],
  }
}

function firstCharge(facts: LiveWithItFacts): Advice {
  return {
    title: 'First charge',
    lead: 'Plug in at the vehicle and, where the cable is loose, at the charging point. Push each plug fully home.',
    steps: [
      ...(facts.randomDelay_min ? [`Nothing may happen for up to ${facts.randomDelay_min} minutes. The wait is meant: it keeps many homes from starting at the same second.`] : []),
      'A schedule in the app or in the vehicle can hold the charge until night. Set it in one of them, not in both.',
      ...(facts.loadLimit_A ? [`When the house uses much at once, the charge slows down or pauses, so that the house stays within ${facts.loadLimit_A}\u202fA. It starts again by itself.`] : []),
      'Stop the charge in the app or at the vehicle before you pull the plug.',
    ],
  }
}

function notCharging(facts: LiveWithItFacts): Advice {
  return {
    title: 'It is not charging',
    lead: 'Five plain checks. None of them needs a tool; never open a cover.',
    steps: [
      'Is the vehicle already full, or at the limit you set in it?',
      'Is a schedule holding it, in the app or in the vehicle?',
      `Has it only just been plugged in? ${facts.randomDelay_min ? `Wait ${facts.randomDelay_min} minutes.` : 'Wait a minute.'}`,
      'Pull the plug, look for dirt or water in it, let it dry, and push it fully home again.',
      `Has ${facts.boardWay} at the consumer unit gone off? Switch it on once. If it goes off again, leave it off and ring us on ${facts.firmTelephone}.`,
    ],
  }
}

function lookAfter(facts: LiveWithItFacts): Advice {
  return {
    title: 'Look after it',
    lead: 'A few minutes twice a year keep it safe.',
    steps: [
      `Every six months press the button marked T on ${facts.boardWay} at the consumer unit. It must switch off at once; switch it on again. If it does not, stop charging and ring us.`,
      'Look at the case, the cable and the plug for cracks, burns or loose parts.',
      'Keep the app and the charging point up to date when they ask.',
      'Tell us before you add solar panels, a battery, a heat pump or a second charging point: the supply must be worked out anew.',
      facts.guaranteeUntil ? `Our guarantee runs to ${formatDay(facts.guaranteeUntil)}.` : 'Guarantee: as in your quote.',
    ],
  }
}
