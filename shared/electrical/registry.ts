/** Every electrical calculation by its name: what the command line and the API list. */
import type { ErasedCalculation } from '../utils/calculation'
import { adiabaticCalculation } from './adiabatic'
import { bondingCalculation } from './bonding'
import { breakingCapacityCalculation } from './breaking-capacity'
import { cableSizeCalculation } from './cable-size'
import { circuitCalculation } from './circuit'
import { conductorResistanceCalculation } from './conductor-resistance'
import { dayCalculation } from './day'
import { demandCalculation } from './demand'
import { designCurrentCalculation } from './design-current'
import { disconnectionTimeCalculation } from './disconnection-time'
import { factorCalculation } from './factor'
import { faultCurrentCalculation } from './fault-current'
import { insulationTestCalculation } from './insulation-test'
import { letThroughCalculation } from './let-through'
import { loopCalculation } from './loop'
import { penElectrodeCalculation } from './pen-electrode'
import { penThreePhaseCalculation } from './pen-three-phase'
import { pilotCalculation } from './pilot'
import { protectiveConductorCalculation } from './protective-conductor'
import { ratingCalculation } from './rating'
import { rcdTestCalculation } from './rcd-test'
import { readingFitsCalculation } from './reading-fits'
import { recordedDemandCalculation } from './recorded-demand'
import { supplyCalculation } from './supply'
import { ttElectrodeCalculation } from './tt-electrode'
import { voltDropCalculation } from './volt-drop'
import { zsLimitCalculation } from './zs-limit'

const calculations: readonly ErasedCalculation[] = [
  designCurrentCalculation,
  ratingCalculation,
  factorCalculation,
  voltDropCalculation,
  cableSizeCalculation,
  conductorResistanceCalculation,
  loopCalculation,
  zsLimitCalculation,
  disconnectionTimeCalculation,
  faultCurrentCalculation,
  breakingCapacityCalculation,
  adiabaticCalculation,
  letThroughCalculation,
  protectiveConductorCalculation,
  bondingCalculation,
  demandCalculation,
  recordedDemandCalculation,
  supplyCalculation,
  dayCalculation,
  circuitCalculation,
  penElectrodeCalculation,
  penThreePhaseCalculation,
  ttElectrodeCalculation,
  pilotCalculation,
  rcdTestCalculation,
  insulationTestCalculation,
  readingFitsCalculation,
]

export const electricalCalculations: Readonly<Record<string, ErasedCalculation>> = Object.fromEntries(calculations.map(each => [each.name, each]))
