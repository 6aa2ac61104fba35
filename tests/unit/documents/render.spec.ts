import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { beforeAll, describe, expect, it } from 'vitest'
import { renderPdf, warmUpPdf, type PaperFonts } from '#server/adapters/pdf'
import { certificateDefinition } from '#server/documents/certificate/layout'
import { invoiceDefinition } from '#server/documents/invoice/layout'
import { noticeDefinition } from '#server/documents/notice/layout'
import { packDefinition } from '#server/documents/pack/layout'
import { quoteDefinition } from '#server/documents/quote/layout'
import { hashRecord } from '#server/services/seal/hash-record'
import { textField } from '#shared/schemas/sealed-record/field'
import { draftSample, installationSample, minorWorksSample } from '../../support/build/sealed-record'
import { readPdf, type PdfSeen } from './read-pdf'
import { invoiceSample, noticeSample, packSample, quoteSample, SEAL } from './samples'

const face = (name: string) => readFileSync(createRequire(import.meta.url).resolve(`@expo-google-fonts/inter/${name}.ttf`))
const fonts: PaperFonts = { regular: face('400Regular/Inter_400Regular'), bold: face('700Bold/Inter_700Bold') }

describe('the pack as a PDF', () => {
  let bytes: Buffer
  let seen: PdfSeen
  beforeAll(async () => {
    await warmUpPdf(fonts)
    bytes = await renderPdf(packDefinition(packSample()), fonts)
    seen = readPdf(bytes)
  }, 60_000)

  it.each(['Ω', '≤', '≥', '²', '√', '°', '×', 'Δ', '“', '÷', '·'])('prints %s so that it can be read back', (sign) => {
    expect(seen.says(sign)).toBe(true)
  })

  it.each(['0.21 Ω', '≤ 0.35 Ω', '0.44 Ω', '0.91 Ω', '24.5 ms', '> 999 MΩ', '≥ 1.0 MΩ', '6 mm²', 'WRN-2027-00042 A', 'Why it stands:', 'From memory: check it against the printed standard', 'npm run --silent calc -- circuit', 'page 1 of'])('prints "%s"', (words) => {
    expect(seen.says(words)).toBe(true)
  })

  it('embeds two faces of Inter, cut down, and nothing else', () => {
    expect(seen.embeddedFaces).toBe(2)
    expect(seen.fontNames.every(name => /^[A-Z]{6}\+Inter-(Regular|Bold)$/.test(name))).toBe(true)
  })

  it('is a tagged archive PDF 1.7 in British English with its title shown', () => {
    expect(seen.raw.startsWith('%PDF-1.7')).toBe(true)
    for (const mark of ['/Marked true', '/Lang (en-GB)', '/DisplayDocTitle true', '<pdfaid:part>3<', '<pdfaid:conformance>B<', '/OutputIntents']) expect(seen.raw).toContain(mark)
  })

  it('carries the record inside, the very bytes its hash is of', () => {
    expect(seen.attached.map(file => createHash('sha256').update(file).digest('hex'))).toEqual([hashRecord(packSample().record)])
  })

  it('is the same to the byte when made again, and stays small', async () => {
    const again = await renderPdf(packDefinition(packSample()), fonts)
    expect(createHash('sha256').update(again).digest('hex')).toBe(createHash('sha256').update(bytes).digest('hex'))
    expect(bytes.length).toBeLessThan(180_000)
  }, 60_000)
})

describe('other papers', () => {
  it.each([
    ['certificate', () => certificateDefinition(installationSample(), SEAL), 'Electrical installation certificate'],
    ['minor works certificate', () => certificateDefinition(minorWorksSample(), SEAL), 'Minor electrical works certificate'],
    ['notice', () => noticeDefinition(noticeSample()), 'DNO-03: demand after the work is 60 A'],
    ['quote', () => quoteDefinition(quoteSample()), '£984.00'],
    ['invoice', () => invoiceDefinition(invoiceSample()), '−£200.00'],
  ])('%s', async (_, define, words) => {
    const seen = readPdf(await renderPdf(define(), fonts))
    expect(seen.says(words)).toBe(true)
    expect(seen.embeddedFaces).toBe(2)
  }, 60_000)

  it('prints DRAFT across each page of a draft, and on no sealed one', async () => {
    const draft = readPdf(await renderPdf(certificateDefinition(draftSample(), null), fonts))
    expect(draft.text.match(/\bDRAFT\b(?!,)/g)).toHaveLength(draft.pages)
    expect(readPdf(await renderPdf(certificateDefinition(installationSample(), SEAL), fonts)).text).not.toContain('DRAFT')
  }, 60_000)

  it('takes a text with signs and mark-up as text', async () => {
    const record = minorWorksSample()
    record.results.remarks = textField('<b>50 % & "more"</b> µ ≥ 1')
    const seen = readPdf(await renderPdf(certificateDefinition(record, SEAL), fonts))
    expect(seen.says('<b>50 % & "more"</b> µ ≥ 1')).toBe(true)
  }, 60_000)

  it('refuses a definition without its own date, and any file or address from outside', async () => {
    await expect(renderPdf({ content: 'x' }, fonts)).rejects.toThrow('date of its record')
    const info = { creationDate: new Date(0) }
    const defaultStyle = { font: 'Inter' }
    await expect(renderPdf({ info, defaultStyle, content: { image: '/etc/hostname' } }, fonts)).rejects.toThrow('denied')
    await expect(renderPdf({ info, defaultStyle, images: { a: 'http://127.0.0.1:9/a.png' }, content: { image: 'a' } }, fonts)).rejects.toThrow('denied')
  }, 60_000)
})
