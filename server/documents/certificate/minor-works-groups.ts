import type { MinorWorksRecord } from '#shared/schemas/sealed-record/minor-works'
import { fact, textFact, type FactGroup } from '../paper/said'

/** The facts of a minor works certificate: an existing circuit altered. */
export function minorWorksGroups(record: MinorWorksRecord): FactGroup[] {
  const { client, installation, work, existingInstallation, supply, circuit, results } = record
  return [
    {
      title: 'Client and work',
      facts: [
        textFact('Client', client.name, [client.address]),
        fact('Address of the work', installation.address),
        fact('Completed', work.completed),
        fact('Location', work.location),
        fact('Description of the work', work.description),
        fact('Existing installation', existingInstallation.comments),
      ],
    },
    {
      title: 'Supply',
      facts: [
        fact('System', supply.system),
        fact('Earthing', supply.earthing),
        fact(supply.impedanceAt, supply.impedance),
        fact('Earthing conductor', supply.earthingConductor),
        fact('Main bonding', supply.bonding),
      ],
    },
    {
      title: 'The circuit',
      facts: [
        fact('Circuit', circuit.identification),
        fact('Protective device: standard', circuit.device.standard),
        fact('Protective device: type', circuit.device.type),
        fact('Protective device: rating', circuit.device.rating),
        fact('Breaking capacity', circuit.device.breakingCapacity),
        fact('Line conductor', circuit.lineSize),
        fact('Protective conductor', circuit.protectiveSize),
        fact('RCD: standard', circuit.rcd.standard),
        fact('RCD: type', circuit.rcd.type),
        fact('RCD: IΔn', circuit.rcd.tripCurrent),
        fact('RCD: rating', circuit.rcd.rating),
        fact('RCD: where', circuit.rcd.place),
        fact('Surge device', circuit.surgeDevice),
        fact('Arc-fault device', circuit.arcFaultDevice),
      ],
    },
    {
      title: 'Tests',
      facts: [
        fact(`Continuity ${results.continuityOf}`, results.continuity),
        fact('Polarity', results.polarity),
        fact('Insulation: test voltage', results.insulation.voltage),
        fact('Insulation: line to line', results.insulation.lineToLine),
        fact('Insulation: line to earth', results.insulation.lineToEarth),
        fact('Insulation: neutral to earth', results.insulation.neutralToEarth),
        fact('Greatest Zs allowed', results.maximumZs),
        fact('Zs measured', results.zs),
        fact('RCD trip time at IΔn', results.rcdTime),
        fact('RCD button', results.rcdButton),
        fact('Arc-fault device button', results.arcFaultButton),
        fact('Remarks', results.remarks),
      ],
    },
  ]
}
