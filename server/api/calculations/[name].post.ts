import { getRouterParam, setResponseStatus } from 'h3'
import * as z from 'zod'
import { answerCalculation } from '#shared/calculations/answer-calculation'

/** The second door of the calculations: takes and gives what `npm run calc` does. */
export default defineFirmHandler({ may: 'use-calculations', body: z.union([z.record(z.string(), z.unknown()), z.array(z.unknown()).max(1000)]) }, ({ event, body }) => {
  const { isAnswered, reply } = answerCalculation(getRouterParam(event, 'name') ?? '', body)
  if (!isAnswered) setResponseStatus(event, 422)
  return reply
})
