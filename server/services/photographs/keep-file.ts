/** A photograph is what it decodes to, not what it calls itself: decoded whole, turned upright, re-encoded, stripped of all metadata. */
import sharp from 'sharp'
import { problem } from '../../../shared/utils/problem'
import { fileStore } from '../../adapters/files'
import { changeAsFirm } from '../../db/firm-db'
import { storedFile } from '../../db/schema/reading'

const MOST_PIXELS = 60_000_000
const LONGEST_SIDE = 2000
const THUMB_SIDE = 400
const ACCEPTED = new Set(['jpeg', 'png', 'webp'])

export const MOST_PHOTOGRAPH_BYTES = 15 * 1024 * 1024

/** Keeps a photograph and its small copy; gives the SHA-256 of the picture kept. Nothing of the file sent is kept as it was. */
export async function keepFile(firmId: string, bytes: Buffer): Promise<{ sha256: string, thumbSha256: string }> {
  const { picture, thumb } = await reencode(bytes)
  const [sha256, thumbSha256] = await Promise.all([fileStore().put(picture), fileStore().put(thumb)])
  await changeAsFirm(firmId, async (tx) => {
    await tx.insert(storedFile).values([{ firmId, sha256, mediaType: 'image/jpeg', bytes: picture.length, thumbSha256 }, { firmId, sha256: thumbSha256, mediaType: 'image/jpeg', bytes: thumb.length, thumbSha256: null }]).onConflictDoNothing()
  })
  return { sha256, thumbSha256 }
}

async function reencode(bytes: Buffer): Promise<{ picture: Buffer, thumb: Buffer }> {
  try {
    const source = sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error', pages: 1 })
    const { format } = await source.metadata()
    if (!format || !ACCEPTED.has(format)) throw new Error(`not a photograph: ${format ?? 'unknown'}`)
    const upright = source.rotate()
    const [picture, thumb] = await Promise.all([
      upright.clone().resize(LONGEST_SIDE, LONGEST_SIDE, { fit: 'inside', withoutEnlargement: true }).flatten({ background: 'white' }).jpeg({ quality: 82 }).toBuffer(),
      upright.clone().resize(THUMB_SIDE, THUMB_SIDE, { fit: 'inside', withoutEnlargement: true }).flatten({ background: 'white' }).jpeg({ quality: 75 }).toBuffer(),
    ])
    return { picture, thumb }
  }
  catch {
    throw problem('check-answers', 'This file is not a photograph we can read. Take it again, or send a JPEG, PNG or WebP picture.', { fields: { file: 'Send a JPEG, PNG or WebP picture' } })
  }
}
