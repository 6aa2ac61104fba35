import * as z from 'zod'

export const INSTRUMENT_FUNCTIONS = ['continuity', 'insulation', 'loop', 'rcd', 'electrode', 'vehicle-adapter'] as const
export const FUNCTION_LABELS: Record<(typeof INSTRUMENT_FUNCTIONS)[number], string> = { 'continuity': 'Continuity', 'insulation': 'Insulation', 'loop': 'Loop impedance and fault current', 'rcd': 'RCD', 'electrode': 'Earth electrode', 'vehicle-adapter': 'Vehicle adapter, 6 mA d.c.' }

const days = {
  doneOn: z.iso.date('Enter the day on the calibration certificate'),
  goodUntil: z.iso.date('Enter the day until which it is good'),
  reference: z.string().trim().max(80).default(''),
}
const inOrder = (given: { doneOn: string, goodUntil: string }) => given.goodUntil >= given.doneOn
const outOfOrder = { message: 'It cannot end before it was done', path: ['goodUntil'] }

export const newInstrumentForm = z.strictObject({
  mutationId: z.uuid(),
  name: z.string().trim().min(1, 'Enter what your people call it').max(60),
  description: z.string().trim().max(160).default(''),
  serial: z.string().trim().min(1, 'Enter the serial number on its plate').max(80),
  functions: z.array(z.enum(INSTRUMENT_FUNCTIONS)).min(1, 'Choose what it measures'),
  ...days,
}).refine(inOrder, outOfOrder)
export type NewInstrument = z.infer<typeof newInstrumentForm>

export const calibrationForm = z.strictObject({ mutationId: z.uuid(), ...days }).refine(inOrder, outOfOrder)
export type NewCalibration = z.infer<typeof calibrationForm>

export const instrumentChange = z.strictObject({ mutationId: z.uuid(), active: z.boolean() })

export interface InstrumentLine { id: string, name: string, description: string, serial: string, functions: (typeof INSTRUMENT_FUNCTIONS)[number][], active: boolean, calibrations: { doneOn: string, goodUntil: string, reference: string }[] }
