import type { PaperFonts } from '../adapters/pdf'

/** The two faces of the papers, from the files that ship with the server. */
export async function loadPaperFonts(): Promise<PaperFonts> {
  const assets = useStorage('assets:fonts')
  const [regular, bold] = await Promise.all([assets.getItemRaw<Uint8Array>('Inter-Regular.ttf'), assets.getItemRaw<Uint8Array>('Inter-Bold.ttf')])
  if (!regular || !bold) throw new Error('The fonts for the papers are missing from this build.')
  return { regular, bold }
}
