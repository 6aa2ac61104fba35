/** The working of one size of a circuit, step by step with the numbers put in. */
import type { WorkingStep } from '../utils/answer'
import type { Basis } from './circuit-basis'
import type { JudgedSize } from './circuit-sizes'
import { showFactors } from './leg-factors'
import { computed, shown, step } from './working'

export function circuitWorking(basis: Basis, size: JudgedSize): WorkingStep[] {
  return [...basis.IbSteps, ...capacitySteps(basis, size), ...dropSteps(basis, size), ...loopSteps(basis, size), ...protectiveSteps(basis, size)]
}

function capacitySteps(basis: Basis, size: JudgedSize): WorkingStep[] {
  return basis.legs.flatMap((leg, index) => {
    const It = size.ratings[index]!
    const where = basis.legs.length > 1 ? ` (leg ${index + 1})` : ''
    return [
      ...leg.steps.map(each => ({ ...each, symbol: `${each.symbol}${where}` })),
      step(`It${where}`, `${size.S_mm2} mm²${leg.method ? `, method ${leg.method}` : ''}`, It.value, 'A', It.source, It.confidence),
      computed(`Iz${where}`, `${shown(It.value)}${showFactors(leg.factors)}`, size.legIz_A[index]!, 'A', 'BS 7671 Appendix 4'),
    ]
  })
}

function dropSteps(basis: Basis, size: JudgedSize): WorkingStep[] {
  const upstream = basis.upstream_V ? `${shown(basis.upstream_V)} + ` : ''
  return [
    step('mV/A/m', `${size.S_mm2} mm²`, size.drop.value, 'mV/A/m', size.drop.source, size.drop.confidence),
    computed('volt drop', `${upstream}${shown(size.drop.value)} × ${shown(basis.Ib_A)} × ${shown(basis.length_m)} ÷ 1000`, size.volt_drop_V, 'V', 'BS 7671 Appendix 4'),
    computed('volt drop', `100 × ${shown(size.volt_drop_V)} ÷ ${shown(basis.U_V)}`, size.percent, '%'),
  ]
}

function loopSteps(basis: Basis, size: JudgedSize): WorkingStep[] {
  const steps = [
    step('r1 + r2', `${size.S_mm2} mm² with ${size.cpc_mm2} mm² at 20 °C`, size.mohm_per_m, 'mΩ/m', 'IEC 60228', 'two sources'),
    step('R1+R2', `${shown(size.mohm_per_m)} × ${shown(basis.length_m)} × ${shown(basis.multiplier)} ÷ 1000`, size.R1R2_ohm, 'Ω', 'IEC 60228; On-Site Guide Table I3 (hot)', 'from memory'),
  ]
  if (size.Zs_ohm !== null) steps.push(computed('Zs', `${shown(basis.outside_ohm!)} + ${shown(size.R1R2_ohm)}`, size.Zs_ohm, 'Ω', basis.system === 'TT' ? 'RA + R1+R2' : 'Ze + R1+R2'))
  if (basis.system === 'TT' && basis.ZsMax_ohm !== undefined) steps.push(step('Zs max', `50 ÷ ${shown(basis.IdeltaN_A!)}`, basis.ZsMax_ohm, 'Ω', 'BS 7671 411.5.3, disconnection in 0.2 s', 'two sources'))
  if (basis.overcurrent) {
    const { Ia_A, IaExpression, ZsMax_ohm, ZsExpression, source, confidence } = basis.overcurrent
    const label = basis.system === 'TT' ? 'Zs for the overcurrent part, information only' : 'Zs max'
    steps.push(step('Ia', IaExpression, Ia_A, 'A', source, confidence), step(label, ZsExpression, ZsMax_ohm, 'Ω', `${source}, disconnection in 0.4 s (common practice for a charging point)`, confidence))
  }
  return steps
}

function protectiveSteps(basis: Basis, size: JudgedSize): WorkingStep[] {
  const steps: WorkingStep[] = []
  if (size.If_A !== null) {
    steps.push(
      computed('If', `${shown(basis.U0_V)} ÷ ${shown(size.Zs_ohm!)}`, size.If_A, 'A'),
      step('S least, far end', `${shown(size.If_A)} × √${shown(basis.t_s)} ÷ ${basis.k.k}`, size.adiabatic_mm2!, 'mm²', `BS 7671 543.1.3, ${basis.k.source}; ${shown(basis.t_s)} s by convention`, basis.k.confidence),
    )
  }
  if (basis.letThrough) {
    const { I2t_A2s, expression, source, confidence } = basis.letThrough
    steps.push(step('I²t, near end', expression, I2t_A2s, 'A²s', source, confidence), step('S least, near end', `√${I2t_A2s} ÷ ${basis.k.k}`, size.nearEnd_mm2!, 'mm²', `BS 7671 434.5.2, ${basis.k.source}`, confidence))
  }
  return steps
}
