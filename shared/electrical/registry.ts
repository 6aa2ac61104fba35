/** Every electrical calculation by its name: what the command line and the API list. */
import type { ErasedCalculation } from '../utils/calculation'
import { circuitCalculation } from './circuit'
import { demandCalculation } from './demand'
import { designCurrentCalculation } from './design-current'
import { supplyCalculation } from './supply'
import { zsLimitCalculation } from './zs-limit'

const calculations: readonly ErasedCalculation[] = [
  designCurrentCalculation,
  zsLimitCalculation,
  demandCalculation,
  supplyCalculation,
  circuitCalculation,
]

export const electricalCalculations: Readonly<Record<string, ErasedCalculation>> = Object.fromEntries(calculations.map(each => [each.name, each]))
