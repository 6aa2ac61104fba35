/**
 * What every answer but a built file says of itself: no cache keeps it, no other site shows or reads it. Pages get their own policy with a nonce on top.
 * Middleware runs in the order of file names: this one before those that refuse.
 */
import { defineEventHandler, setResponseHeaders } from 'h3'

const DATA = /^\/(api|c)\//

export default defineEventHandler((event) => {
  setResponseHeaders(event, { 'cache-control': 'no-store', 'cross-origin-resource-policy': 'same-origin' })
  if (DATA.test(event.path)) setResponseHeaders(event, { 'content-security-policy': 'base-uri \'none\'; form-action \'self\'; frame-ancestors \'none\'' })
})
