/** Pieces that the input schemas share, with their messages in words. What may be left out is optional; the calculation says what it then takes or waits for. */
import * as z from 'zod'

/** An object that refuses keys it does not know: a misspelt limit must not fall back to a default unseen. */
export function fields<Shape extends z.core.$ZodLooseShape>(shape: Shape) {
  return z.strictObject(shape, {
    error: issue => issue.code === 'unrecognized_keys'
      ? `Not an input here: ${issue.keys.join(', ')}. Check the spelling.`
      : 'Give the inputs as an object.',
  })
}

export const above = (what: string) => z.number(`Give ${what} as a number.`).positive(`Give ${what} as a number above zero.`).optional()
export const fromZero = (what: string) => z.number(`Give ${what} as a number.`).nonnegative(`Give ${what} as a number not below zero.`).optional()
export const anyNumber = (what: string) => z.number(`Give ${what} as a number.`).optional()
export const yesNo = (what: string) => z.boolean(`Say true or false for ${what}.`).optional()
export const oneOf = <const Words extends readonly [string, ...string[]]>(what: string, words: Words) =>
  z.enum(words, `Give ${what} as one of: ${words.join(', ')}.`).optional()

export const phases = z.literal([1, 3], 'Give the phases as 1 or 3.').optional()
export const powerFactor = z.number('Give the power factor as a number.').positive('Give the power factor as a number above zero.').max(1, 'A power factor is at most 1.').optional()
export const factorGiven = (symbol: string) => above(`the factor ${symbol}`)
export const efficiency = z.number('Give the efficiency as a number.').positive('Give the efficiency as a number above zero.').max(1, 'An efficiency is at most 1 (90 % is 0.9).').optional()
export const size_mm2 = above('the size')
export const clockTime = (what: string) => z.string(`Give ${what} as a time such as 16:00.`).regex(/^([01]\d|2[0-3]):[0-5]\d$/, `Give ${what} as a time such as 16:00.`)

export const U0_V = above('the voltage to earth')
export const U_V = above('the voltage')
export const Cmin = above('Cmin')
export const system = oneOf('the system', ['TN', 'TT'])
