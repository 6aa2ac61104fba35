import { inflateSync } from 'node:zlib'

/** Just enough of a PDF reader to see what our own papers hold, so that the tests need no tool beside Node. */
export interface PdfSeen { pages: number, text: string, /** Whether the words stand in it, wherever lines break. */ says: (words: string) => boolean, attached: Buffer[], fontNames: string[], embeddedFaces: number, raw: string }

const squeezed = (text: string) => text.replace(/\s/g, '')

interface PdfObject { id: string, head: string, stream: Buffer | null }

export function readPdf(bytes: Buffer): PdfSeen {
  const raw = bytes.toString('latin1')
  const objects = new Map(objectsOf(raw).map(one => [one.id, one]))
  const all = [...objects.values()]
  const fonts = fontsOf(all, objects)
  const pages = all.filter(one => /\/Type \/Page\b(?!s)/.test(one.head))
  const contents = pages.map(page => objects.get(/\/Contents (\d+) 0 R/.exec(page.head)?.[1] ?? '')?.stream?.toString('latin1') ?? '')
  const text = contents.map(content => textOf(content, fonts)).join('\n')
  return {
    pages: pages.length,
    text,
    says: words => squeezed(text).includes(squeezed(words)),
    attached: all.flatMap(one => (/\/Type \/EmbeddedFile/.test(one.head) && one.stream ? [one.stream] : [])),
    fontNames: [...new Set(all.flatMap(one => /\/BaseFont \/([^\s/]+)/.exec(one.head)?.[1] ?? []))],
    embeddedFaces: all.filter(one => /\/Type \/FontDescriptor/.test(one.head) && /\/FontFile2 \d+ 0 R/.test(one.head)).length,
    raw,
  }
}

function objectsOf(raw: string): PdfObject[] {
  return [...raw.matchAll(/(?:^|\n)(\d+) 0 obj\n([\s\S]*?)\nendobj/g)].map((found) => {
    const [, id = '', body = ''] = found
    const at = body.indexOf('\nstream\n')
    if (at < 0) return { id, head: body, stream: null }
    const head = body.slice(0, at)
    const packed = Buffer.from(body.slice(at + 8, body.lastIndexOf('\nendstream')), 'latin1')
    return { id, head, stream: head.includes('/FlateDecode') ? inflateSync(packed) : packed }
  })
}

/** For each name a page calls a font by (`F1`), what each of its codes reads as. */
function fontsOf(all: PdfObject[], objects: Map<string, PdfObject>): Map<string, string[]> {
  const named = all.flatMap(one => [...one.head.matchAll(/\/(F\d+) (\d+) 0 R/g)].map(found => [found[1] ?? '', found[2] ?? ''] as const))
  return new Map(named.map(([name, id]) => {
    const map = objects.get(/\/ToUnicode (\d+) 0 R/.exec(objects.get(id)?.head ?? '')?.[1] ?? '')?.stream?.toString('latin1') ?? ''
    const ranges = [...map.matchAll(/<[0-9a-f]{4}> <[0-9a-f]{4}> \[([^\]]*)\]/gi)].flatMap(found => [...(found[1] ?? '').matchAll(/<([0-9a-f ]*)>/gi)])
    return [name, ranges.map(found => fromHex(found[1] ?? ''))]
  }))
}

const fromHex = (hex: string) => Buffer.from(hex.replace(/ /g, ''), 'hex').swap16().toString('utf16le')

function textOf(content: string, fonts: Map<string, string[]>): string {
  let codes: string[] = []
  const pieces: string[] = []
  for (const [, name, shown] of content.matchAll(/\/(F\d+) [\d.]+ Tf|\[((?:<[0-9a-f]*>|[\s\d.-])*)\] TJ/gi)) {
    if (name) codes = fonts.get(name) ?? []
    else pieces.push([...(shown ?? '').matchAll(/<([0-9a-f]*)>/gi)].map(found => (found[1] ?? '').match(/.{4}/g)?.map(code => codes[Number.parseInt(code, 16)] ?? '').join('') ?? '').join(''))
  }
  return pieces.join(' ').replace(/[\s\u202f]+/g, ' ')
}
