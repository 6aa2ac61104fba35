/** Where the font's own programme for swapping signs by their neighbours is named. */
const SWAP_BY_NEIGHBOUR = 'calt'
const UNUSED_TAG = 'zzzz'

/**
 * A face that prints what was written: Inter would draw an arrow for `->` and a multiplication sign for the x of `2x3`.
 * The feature's name is changed in a copy of the font, which also saves most of the time that laying out a word takes.
 *
 * @source OpenType: table directory (16 bytes a table after 12), GSUB feature list (6 bytes a record after its count)
 */
export function plainFace(font: Uint8Array): Buffer {
  const copy = Buffer.from(font)
  const substitutions = tableAt(copy, 'GSUB')
  if (substitutions === null) return copy
  const list = substitutions + copy.readUInt16BE(substitutions + 6)
  for (let record = 0; record < copy.readUInt16BE(list); record++) {
    const at = list + 2 + 6 * record
    if (copy.toString('latin1', at, at + 4) === SWAP_BY_NEIGHBOUR) copy.write(UNUSED_TAG, at, 'latin1')
  }
  return copy
}

function tableAt(font: Buffer, tag: string): number | null {
  for (let table = 0; table < font.readUInt16BE(4); table++) {
    const at = 12 + 16 * table
    if (font.toString('latin1', at, at + 4) === tag) return font.readUInt32BE(at + 8)
  }
  return null
}
