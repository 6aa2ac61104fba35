/** Every kind of mutation and what applies it. A kind without an entry here stops the start of the tests. */
import { MUTATION_KINDS } from '../../shared/job/mutations'
import { answerQuery } from './answer-query'
import { finishSurvey } from './finish-survey'
import { changeCustomer, changeJob, changePremises } from './change-columns'
import { changePart, removePart } from './change-part'
import type { Apply } from './mutation'
import { keepPhotograph, removePhotograph } from './photographs'
import { addReading, confirmReading } from './readings'

const special: Record<string, Apply<never>> = {
  'change-job': changeJob,
  'change-customer': changeCustomer,
  'change-premises': changePremises,
  'add-reading': addReading,
  'confirm-reading': confirmReading,
  'keep-photograph': keepPhotograph,
  'remove-photograph': removePhotograph,
  'answer-query': answerQuery,
  'finish-survey': finishSurvey,
}

/** What applies a kind, or undefined where nothing does. */
export function applierOf(kind: string): Apply<never> | undefined {
  const part = MUTATION_KINDS[kind]?.part
  if (!part) return special[kind]
  return kind.startsWith('remove-') ? removePart(part) : changePart(part)
}
