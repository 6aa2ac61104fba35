/** Quantities as tagged numbers: no run-time weight, and a metre cannot be passed for an amp. */
declare const unitTag: unique symbol
type Quantity<U extends string> = number & { readonly [unitTag]: U }

export type Amps = Quantity<'A'>
export type Volts = Quantity<'V'>
export type Ohms = Quantity<'Ω'>
export type Metres = Quantity<'m'>
export type SquareMillimetres = Quantity<'mm²'>
export type Pence = Quantity<'p'>

export const amps = (n: number) => n as Amps
export const volts = (n: number) => n as Volts
export const ohms = (n: number) => n as Ohms
export const metres = (n: number) => n as Metres
export const squareMillimetres = (n: number) => n as SquareMillimetres
export const pence = (n: number) => n as Pence
