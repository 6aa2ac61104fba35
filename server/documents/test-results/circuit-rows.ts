import type { PrintedField } from '#shared/schemas/sealed-record/field'
import type { TestedCircuit } from '#shared/schemas/sealed-record/test-schedule'
import { fact, type FactGroup } from '../paper/said'

/** The circuit as installed. */
export function circuitGroup(circuit: TestedCircuit): FactGroup {
  return {
    title: 'As installed',
    facts: [
      fact('Circuit number', circuit.number),
      fact('Description', circuit.description),
      fact('Wiring type', circuit.wiringType),
      fact('Reference method', circuit.referenceMethod),
      fact('Points served', circuit.points),
      fact('Line conductor', circuit.lineSize),
      fact('Protective conductor', circuit.protectiveSize),
      fact('Device: standard', circuit.device.standard),
      fact('Device: type', circuit.device.type),
      fact('Device: rating', circuit.device.rating),
      fact('Device: breaking capacity', circuit.device.breakingCapacity),
      fact('Disconnection time used', circuit.disconnectionTime),
      fact('Greatest Zs allowed', circuit.maximumZs),
      fact('That limit rests on', circuit.maximumZsBasis),
      fact('RCD: standard', circuit.rcd.standard),
      fact('RCD: type', circuit.rcd.type),
      fact('RCD: IΔn', circuit.rcd.tripCurrent),
      fact('RCD: rating', circuit.rcd.rating),
      fact('RCD: where', circuit.rcd.place),
      fact('6 mA d.c. detection', circuit.dcDetection),
    ],
  }
}

/** The readings in the order in which they are taken: dead, then live, then by trying. */
export function readingsOf(circuit: TestedCircuit): [string, PrintedField][] {
  const { ring, insulation, functional } = circuit
  return [
    ['Ring, line r1', ring.r1],
    ['Ring, neutral rn', ring.rn],
    ['Ring, protective r2', ring.r2],
    [`Continuity ${circuit.continuityOf}`, circuit.continuity],
    ['Continuity R1+Rn', circuit.r1rn],
    ['Insulation: test voltage', insulation.voltage],
    ['Insulation: charger connected', insulation.chargerConnected],
    ['Insulation: line to line', insulation.lineToLine],
    ['Insulation: line to earth', insulation.lineToEarth],
    ['Insulation: neutral to earth', insulation.neutralToEarth],
    ['Polarity', circuit.polarity],
    ['Zs measured', circuit.zs],
    ['Zs corrected for temperature', circuit.zsCorrected],
    ['RCD trip time at IΔn', circuit.rcdTime],
    ['6 mA d.c. trip', circuit.dcTrip],
    ['RCD button', circuit.rcdButton],
    ['Arc-fault device button', circuit.arcFaultButton],
    ['Vehicle states', functional.vehicleStates],
    ['Protective-conductor fault', functional.protectiveConductorFault],
    ['Open-PEN function', functional.openPen],
    ['Load limiter seen to limit', functional.loadLimiter],
    ['Randomised delay restored', functional.randomDelay],
    ['Isolation', functional.isolation],
    ['Remarks', circuit.remarks],
  ]
}
