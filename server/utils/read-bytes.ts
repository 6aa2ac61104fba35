import type { H3Event } from 'h3'
import { problem } from '../../shared/utils/problem'

/** The body's bytes, cut off as soon as they pass the limit. */
export async function readBytes(event: H3Event, most: number): Promise<Buffer> {
  const chunks: Buffer[] = []
  let length = 0
  for await (const chunk of event.node.req as AsyncIterable<Buffer>) {
    length += chunk.length
    if (length > most) throw problem('too-large', `A photograph may have at most ${Math.floor(most / 1024 / 1024)} MB.`)
    chunks.push(chunk)
  }
  if (!length) throw problem('check-answers', 'The file arrived empty. Choose it again.')
  return Buffer.concat(chunks)
}
