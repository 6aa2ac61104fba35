import type { Content } from 'pdfmake/interfaces'
import { encode } from 'uqr'
import { MM } from './tokens'

const CODE_SIZE = 18.5 * MM
const QUIET_MODULES = 4

/** A square code for an address: 18.5 mm of code inside a quiet zone of four modules, drawn as one path. */
export function qrDrawing(address: string): Content {
  const { data, size } = encode(address, { ecc: 'M', border: 0 })
  const path = data.flatMap((row, y) => row.flatMap((dark, x) => (dark ? [`M${x} ${y}h1v1h-1z`] : []))).join('')
  const whole = size + 2 * QUIET_MODULES
  const width = CODE_SIZE * whole / size
  return { svg: `<svg xmlns="http://www.w3.org/2000/svg" viewBox="-${QUIET_MODULES} -${QUIET_MODULES} ${whole} ${whole}"><path d="${path}" fill="#000000"/></svg>`, width, height: width }
}
