/** What a whole circuit is asked with. */
import * as z from 'zod'
import { CABLE_WORDS, METHOD_WORDS } from './cables'
import { DEVICE_WORDS } from './device-limits'
import { above, anyNumber, Cmin, factorGiven, fields, fromZero, oneOf, phases, powerFactor, size_mm2, system, U0_V, U_V } from './inputs'
import { ARRANGEMENTS, LAYINGS } from './rating-factors'

/** What lies around a stretch of cable, as `cable-size` and each leg of `circuit` take it. */
export const surroundings = {
  method: oneOf('the method', METHOD_WORDS),
  ambient_C: anyNumber('the air temperature'),
  ground_C: anyNumber('the ground temperature'),
  circuits: z.int('Give the number of circuits as a whole number.').min(1, 'Count this circuit too: at least 1.').optional(),
  arrangement: oneOf('the arrangement', ARRANGEMENTS),
  insulationLength_mm: fromZero('the length within insulation'),
  depth_m: above('the depth'),
  rho_Km_per_W: above('the soil resistivity'),
  laying: oneOf('the laying', LAYINGS),
}

export const terminals_C = z.literal([70, 90], 'Give the terminals\' temperature as 70 or 90.').optional()
export const energyClass = z.literal([1, 2, 3], 'Give the energy class as 1, 2 or 3.').optional()

export const circuitInput = fields({
  Ib_A: above('the design current'),
  P_kW: above('the power in kW'),
  powerFactor, phases, U_V, U0_V, Cmin, system, terminals_C, energyClass,
  device: oneOf('the device', DEVICE_WORDS),
  In_A: above('the device\'s rating'),
  cable: oneOf('the cable', CABLE_WORDS),
  legs: z.array(fields({ ...surroundings, L_m: fromZero('the length') }), 'Give the legs as a list.').max(100, 'At most 100 legs.').optional(),
  Ze_ohm: fromZero('Ze'),
  RA_ohm: fromZero('the electrode\'s resistance'),
  IdeltaN_A: above('the rated residual current in A'),
  Ipf_kA: above('the fault current in kA'),
  device_kA: above('the device\'s breaking capacity in kA'),
  upstreamDrop_V: fromZero('the volt drop upstream'),
  limit_percent: above('the limit in percent'),
  Cc: factorGiven('Cc'),
  cpc_mm2: above('the protective conductor\'s size'),
  S_mm2: size_mm2,
})
export type CircuitInput = z.infer<typeof circuitInput>
