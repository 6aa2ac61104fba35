/** Every calculation by the name it is asked for: the one list behind the command line, the API route and the pages. */
import { electricalCalculations } from '../electrical/registry'
import { certificateKindCalculation } from '../job/rules/certificate-kind'
import { deadlinesCalculation } from '../job/rules/deadlines'
import { earthingMethodCalculation } from '../job/rules/earthing-method'
import { mountingCalculation } from '../job/rules/mounting'
import { mpanCalculation } from '../job/rules/mpan'
import { networkRouteCalculation } from '../job/rules/network-route'
import { smartWindowCalculation } from '../job/rules/smart-window'
import { cancellationCalculation } from '../pricing/cancellation'
import { grantCalculation } from '../pricing/grant'
import { invoiceCalculation } from '../pricing/invoice'
import type { ErasedCalculation } from '../utils/calculation'

const jobCalculations: readonly ErasedCalculation[] = [
  mpanCalculation,
  networkRouteCalculation,
  deadlinesCalculation,
  smartWindowCalculation,
  certificateKindCalculation,
  grantCalculation,
  invoiceCalculation,
  cancellationCalculation,
  mountingCalculation,
  earthingMethodCalculation,
]

export const calculations: Readonly<Record<string, ErasedCalculation>> = {
  ...electricalCalculations,
  ...Object.fromEntries(jobCalculations.map(each => [each.name, each])),
}
