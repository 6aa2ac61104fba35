const LONGEST_SIDE = 2000
const SMALL_ENOUGH_BYTES = 1_200_000

/** The size of a picture whose longer side is at most 2,000 px; never larger than it is. */
export function shrunkSize(width: number, height: number): { width: number, height: number } {
  const factor = Math.min(1, LONGEST_SIDE / Math.max(width, height, 1))
  return { width: Math.round(width * factor), height: Math.round(height * factor) }
}

/** A large picture made smaller before it is sent, as JPEG and upright. Where the browser cannot, it goes as it is: the server reads it again anyhow. */
export async function shrinkPicture(file: File): Promise<Blob> {
  if (file.size <= SMALL_ENOUGH_BYTES && file.type === 'image/jpeg') return file
  try {
    const bitmap = await createImageBitmap(file, { imageOrientation: 'from-image' })
    const size = shrunkSize(bitmap.width, bitmap.height)
    const canvas = Object.assign(document.createElement('canvas'), size)
    canvas.getContext('2d')?.drawImage(bitmap, 0, 0, size.width, size.height)
    bitmap.close()
    return await new Promise<Blob>(resolve => canvas.toBlob(blob => resolve(blob ?? file), 'image/jpeg', 0.85))
  }
  catch {
    return file
  }
}
