/** Changes are taken only from our own pages: the browser's word for where a request comes from, or a matching Origin. */
import { createError, defineEventHandler, getRequestHeader, getRequestURL } from 'h3'
import { config } from '../utils/config'

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS'])
const SIGNED = new Set(['/api/stripe/webhook'])

export default defineEventHandler((event) => {
  const path = event.path.split('?')[0]!
  if (SAFE.has(event.method) || SIGNED.has(path)) return
  const origin = getRequestHeader(event, 'origin')
  const site = getRequestHeader(event, 'sec-fetch-site')
  const ours = new Set([new URL(config().baseUrl).origin, getRequestURL(event, { xForwardedHost: false, xForwardedProto: false }).origin])
  const isOurs = origin ? ours.has(origin) && (site === undefined || site === 'same-origin') : site === 'same-origin'
  const type = (getRequestHeader(event, 'content-type') ?? '').split(';')[0]!.trim()
  const isTaken = type === 'application/json' || type === 'application/octet-stream' || type.startsWith('image/') || (type === '' && event.method === 'DELETE')
  const isForm = type === 'application/x-www-form-urlencoded' && path.startsWith('/c/')
  if (!isOurs || !(isTaken || isForm)) throw createError({ statusCode: 403, statusMessage: 'not-allowed', data: { code: 'not-allowed', message: 'This request did not come from one of our pages.' } })
})
