import type { Content } from 'pdfmake/interfaces'
import { encode } from 'uqr'
import { MM } from './tokens'

const CODE_SIZE = 18.5 * MM
const QUIET_MODULES = 4

/** A square code for an address: 18.5 mm of code inside a quiet zone of four modules, drawn as one path. */
export function qrDrawing(address: string): Content {
  const { data, size } = encode(address, { ecc: 'M', border: 0 })
  const path = data.flatMap((row, y) => runsOf(row).map(([x, length]) => `M${x} ${y}h${length}v1h-${length}z`)).join('')
  const whole = size + 2 * QUIET_MODULES
  const width = CODE_SIZE * whole / size
  return { svg: `<svg xmlns="http://www.w3.org/2000/svg" viewBox="-${QUIET_MODULES} -${QUIET_MODULES} ${whole} ${whole}"><path d="${path}" fill="#000000"/></svg>`, width, height: width }
}

/** Each unbroken run of dark modules in a row, as its start and length. */
function runsOf(row: boolean[]): [start: number, length: number][] {
  const runs: [number, number][] = []
  row.forEach((dark, x) => {
    const last = runs.at(-1)
    if (!dark) return
    if (last && last[0] + last[1] === x) last[1]++
    else runs.push([x, 1])
  })
  return runs
}
