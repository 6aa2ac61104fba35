/** The judge of each test. */
import type { TestKey } from '../../tests.data'
import { cableInsulation, chargerInsulation } from './insulation'
import { R1R2, R1Rn, Zs, ZsBoard } from './loop'
import { Ipf, IpfBoard, RA, Ze } from './origin'
import type { TestJudge } from './outcome'
import { RcdDc, RcdTime, Seen } from './residual'

export const TEST_JUDGES: Record<TestKey, TestJudge> = {
  'supply-polarity': Seen,
  'Ze': Ze,
  'Ipf': Ipf,
  'R1R2': R1R2,
  'R1Rn': R1Rn,
  'IR-live-earth': cableInsulation,
  'IR-neutral-earth': cableInsulation,
  'IR-line-neutral': cableInsulation,
  'IR-line-line': cableInsulation,
  'IR-charger': chargerInsulation,
  'polarity': Seen,
  'RA': RA,
  'Zs-board': ZsBoard,
  'Ipf-board': IpfBoard,
  'phase-sequence': Seen,
  'Zs': Zs,
  'RCD-time': RcdTime,
  'RCD-dc': RcdDc,
  'RCD-button': Seen,
  'vehicle-states': Seen,
  'PE-fault': Seen,
  'open-PEN': Seen,
  'limiter': Seen,
  'delay-restored': Seen,
  'isolation': Seen,
}
