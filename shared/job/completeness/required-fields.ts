/** The fields that an installation certificate cannot do without (particulars as in the form's edition), and when each counts. */
import type { Part } from '../parts'
import type { JobFacts } from '../judge/facts'
import type { Holder } from './types'

export interface RequiredField {
  part: Part
  key: string
  field: string
  /** What to do, as a sentence. */
  sentence: string
  with?: Holder
  when?: (facts: JobFacts, content: Record<string, unknown>) => boolean
  /** Without it the job is worth a look, no more. */
  isNice?: boolean
}

const survey = (field: string, sentence: string, rest: Partial<RequiredField> = {}): RequiredField => ({ part: 'survey', key: 'survey', field, sentence, ...rest })
/** Read as installed, each field falling back on the design. */
const circuit = (field: string, sentence: string, rest: Partial<RequiredField> = {}): RequiredField => ({ part: 'circuit', key: 'installed', field, sentence, ...rest })
const equipment = (key: string, field: string, sentence: string, rest: Partial<RequiredField> = {}): RequiredField => ({ part: 'equipment', key, field, sentence, ...rest })
const limit = (field: string, sentence: string): RequiredField => ({ part: 'loadLimit', key: 'limit', field, sentence, when: facts => facts.hasLimiter })
const statement = (field: string, sentence: string, rest: Partial<RequiredField> = {}): RequiredField => ({ part: 'statement', key: 'statement', field, sentence, ...rest })

const hasBond = (_: JobFacts, content: Record<string, unknown>) => ['water', 'gas', 'oil', 'steel', 'lightning', 'other'].some(each => content[`bond_${each}`] === 'yes')
const isRcdSwitch = (facts: JobFacts) => facts.isMainSwitchRcd

export const REQUIRED_FIELDS: readonly RequiredField[] = [
  survey('earthing', 'Choose the earthing arrangement.'),
  survey('earthing_evidence', 'Say what shows the earthing arrangement.'),
  survey('supply_phases', 'Choose the phases of the supply.'),
  survey('nominal_V', 'Enter the nominal voltage.'),
  survey('frequency_Hz', 'Enter the frequency.'),
  survey('cutout_A', 'Enter the rating of the main fuse.'),
  survey('cutout_standard', 'Choose the standard of the main fuse.'),
  survey('service_ok', 'Say how cut-out, meter and tails look.'),
  survey('looped', 'Say whether the supply is looped.'),
  survey('unmetered', 'Say whether the supply is unmetered.'),
  survey('other_sources', 'Choose the other sources of supply, or none.'),
  survey('generation_kW', 'Enter the generation and storage in all.', { when: facts => facts.hasOtherSources }),
  survey('asbestos', 'Say whether an old board or flash guards may hold asbestos.', { isNice: true }),
  survey('board_name', 'Name the board.'),
  survey('board_location', 'Say where the board is.'),
  survey('main_switch_location', 'Say where the main switch is.'),
  survey('main_switch_standard', 'Enter the main switch\'s standard and type.'),
  survey('main_switch_poles', 'Enter the main switch\'s poles.'),
  survey('main_switch_A', 'Enter the main switch\'s current rating.'),
  survey('main_switch_V', 'Enter the main switch\'s voltage rating.'),
  survey('main_switch_rcd', 'Say whether the main switch is a residual-current device.'),
  survey('main_switch_IdeltaN_mA', 'Enter the main switch\'s residual current rating.', { when: isRcdSwitch }),
  survey('main_switch_delay_ms', 'Enter the main switch\'s time delay, 0 where there is none.', { when: isRcdSwitch }),
  survey('main_switch_ms', 'Enter the main switch\'s measured time.', { when: isRcdSwitch }),
  survey('upstream_rcd', 'Say which residual-current device is upstream of the new circuit, or none.'),
  survey('spd', 'Record the decision on a surge device.'),
  survey('spd_type', 'Enter the surge device\'s type and what its indicator shows.', { when: facts => facts.hasSurgeDevice }),
  survey('spd_reason', 'Say why there is no surge device and who decided.', { when: (_, content) => content.spd === 'declined' || content.spd === 'not_needed' }),
  survey('earthing_conductor_material', 'Choose the earthing conductor\'s material.'),
  survey('earthing_conductor_mm2', 'Enter the earthing conductor\'s size.'),
  survey('earthing_conductor_verified', 'Verify the earthing conductor\'s continuity and connection.'),
  survey('bonding_material', 'Choose the main bonding\'s material.', { when: hasBond }),
  survey('bonding_mm2', 'Enter the main bonding\'s size.', { when: hasBond }),
  survey('bonding_verified', 'Verify the main bonding\'s continuity.', { when: hasBond }),
  survey('bond_water', 'Say whether water is bonded.'),
  survey('bond_gas', 'Say whether gas is bonded.'),
  survey('bond_oil', 'Say whether oil is bonded.'),
  survey('bond_steel', 'Say whether structural steel is bonded.'),
  survey('bond_lightning', 'Say whether lightning protection is bonded.'),
  survey('bond_other', 'Say whether any other service is bonded.'),
  survey('existing_comments', 'Comment on the existing installation, or write "No comments".'),
  survey('outdoors', 'Say whether the vehicle charges out of doors.'),
  survey('other_earths', 'Say whether metal with another earth stands within 2.5 m of the vehicle.', { when: facts => facts.needsElectrode }),

  circuit('number', 'Enter the circuit\'s number.'),
  circuit('description', 'Describe the circuit.'),
  circuit('points', 'Enter how many points the circuit serves.'),
  circuit('phases', 'Choose the circuit\'s phases.'),
  circuit('device', 'Choose the protective device.'),
  circuit('device_standard', 'Choose the protective device\'s standard.'),
  circuit('In_A', 'Enter the protective device\'s rating.'),
  circuit('device_kA', 'Enter the protective device\'s breaking capacity.'),
  circuit('cable', 'Choose the cable.'),
  circuit('S_mm2', 'Enter the line conductor\'s size.'),
  circuit('cpc_mm2', 'Enter the protective conductor\'s size.'),
  circuit('rcd_where', 'Say where the residual-current device is.'),
  circuit('rcd_standard', 'Enter the residual-current device\'s standard.'),
  circuit('rcd_type', 'Choose the residual-current device\'s type.'),
  circuit('rcd_IdeltaN_mA', 'Enter the rated residual current.'),
  circuit('rcd_A', 'Enter the residual-current device\'s rating.'),
  circuit('dc_where', 'Say where direct fault current of 6 mA is detected.'),

  { part: 'earthing', key: 'earthing', field: 'method', sentence: 'Choose the earthing method for the charging point.' },
  { part: 'earthing', key: 'earthing', field: 'reason', sentence: 'Say why this earthing method.' },
  { part: 'earthing', key: 'earthing', field: 'device', sentence: 'Name the open-PEN device, its standard and where it is.', when: facts => facts.hasOpenPen },

  equipment('charger', 'description', 'Say what charger was fitted.'),
  equipment('charger', 'rating_A', 'Enter the charger\'s rating.'),
  equipment('charger', 'serial', 'Enter the charger\'s serial number.'),
  equipment('charger', 'serial_again', 'Enter the charger\'s serial number a second time.'),
  equipment('charger', 'location', 'Say where the charger is fitted.'),
  equipment('charger', 'labels', 'Fix the labels, and say so.'),
  equipment('charger', 'standard', 'Enter the standard the charger is made to.', { isNice: true }),
  equipment('charger', 'firmware', 'Enter the charger\'s firmware.', { isNice: true }),
  equipment('electrode', 'description', 'Say what kind of electrode was used.', { when: facts => facts.needsElectrode }),
  equipment('electrode', 'location', 'Say where the electrode is.', { when: facts => facts.needsElectrode }),

  limit('limit_A', 'Enter the load limit agreed or wanted.'),
  limit('set_A', 'Enter the load limit as set.'),
  limit('set_where', 'Say where the load limit was set.'),
  limit('ct_checked', 'Check which way round the current transformer is, and on which conductor.'),
  limit('fails_safe', 'Check that charging stops when the measurement is lost.'),

  statement('nature', 'Say whether the work is new, an addition or an alteration.'),
  statement('description', 'Describe the work and its extent.'),
  statement('not_covered', 'Say what is expressly not covered.'),
  statement('next_inspection_years', 'Recommend when the next inspection is due.'),
  statement('completed_on', 'Enter the day on which the work was completed.'),
]
