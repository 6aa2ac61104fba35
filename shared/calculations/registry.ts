/** Every calculation by the name it is asked for: the one list behind the command line, the API route and the pages. */
import type { ErasedCalculation } from '../utils/calculation'
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

export const jobCalculations = {
  'mpan': mpanCalculation,
  'network-route': networkRouteCalculation,
  'deadlines': deadlinesCalculation,
  'smart-window': smartWindowCalculation,
  'certificate-kind': certificateKindCalculation,
  'grant': grantCalculation,
  'invoice': invoiceCalculation,
  'cancellation': cancellationCalculation,
  'mounting': mountingCalculation,
  'earthing-method': earthingMethodCalculation,
} as unknown as Record<string, ErasedCalculation>

export const calculations: Record<string, ErasedCalculation> = { ...jobCalculations }
